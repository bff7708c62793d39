import type { Transaction } from "sequelize";
import type { ImportKind } from "~/schemas/imports/import-kind";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import type { Act } from "~/schemas/people/act";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import type { CurrentPerson } from "~/services/people/current-person";
import type { RevisionName } from "~/services/revision/revision-name";
import type { CsvProblem } from "~/utils/csv/csv-problem";

/** What a row would do: `before` is what is there, `after` what will be. */
export interface Decision {
  row: ImportRow<unknown>;
  before: object | null;
  after: object | null;
  problems: CsvProblem[];
  /** Said beside the row without refusing it. */
  notes?: string[];
}

export interface ImportPlan {
  /** One a row, in the order of the rows. */
  decisions: Decision[];
  /** What goes that no row names: lines of a structure that the file replaces. */
  removed?: object[];
  /** Whether there is anything to write. */
  changes: boolean;
  /** Does it. Only called when no row is refused. */
  write: () => Promise<void>;
}

export interface ImportContext {
  transaction: Transaction;
  person: CurrentPerson;
  /** Columns that the file has; what stands under another column stays as it is. */
  columns: ReadonlySet<string>;
  /** SHA-256 of the file. */
  fileHash: string;
}

/** How one kind of file comes in. Preview and import share `plan`. */
export interface ImportJob<Row> {
  name: ImportKindName;
  act: Act;
  kind: ImportKind<Row>;
  /** Locked before the plan is made and raised after it is written, in this order. */
  revisions: readonly RevisionName[];
  plan: (rows: readonly ImportRow<Row>[], context: ImportContext) => Promise<ImportPlan>;
}
