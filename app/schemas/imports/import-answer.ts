import type { ImportKindName } from "./import-kind-name";

export type ImportResult = "new" | "changed" | "same" | "refused";

/** One thing that is wrong with a row, or with the file as a whole. */
export interface ImportError {
  line?: number;
  column?: string;
  value?: string;
  /** The value is a header that the kind of file does not have. */
  unknownHeader?: true;
  message: string;
}

export interface ImportLine {
  /** Physical line of the file. */
  line: number;
  result: ImportResult;
  before: object | null;
  after: object | null;
  errors: ImportError[];
  notes: string[];
}

/** The answer to an import, done or only tried. */
export interface ImportAnswer {
  kind: ImportKindName;
  dryRun: boolean;
  encoding: string;
  delimiter: string;
  rows: ImportLine[];
  /** Structure lines that go since the file does not have them. */
  removed: object[];
  counts: Record<ImportResult | "removed", number>;
}
