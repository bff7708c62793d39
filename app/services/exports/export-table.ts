import type { Transaction } from "sequelize";
import type { ExportKindName } from "~/schemas/exports/export-kind-name";
import type { Act } from "~/schemas/people/act";

export type ExportRow = Record<string, string | number | boolean | null>;

/** How one kind of file leaves the book: the columns are those that its import takes. */
export interface ExportTable {
  name: ExportKindName;
  /** Who may have it. */
  act: Act;
  columns: readonly string[];
  /** Columns that only people who may see costs get; for the others they are left out. */
  costColumns?: readonly string[];
  /** Gives the rows piece by piece, in an order that does not hang on ids. */
  read: (transaction?: Transaction) => AsyncIterable<ExportRow[]>;
}
