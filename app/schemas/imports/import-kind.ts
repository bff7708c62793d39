import type { z } from "zod";

/** The columns of one kind of CSV file, and the schema that turns one row's cells into a typed row. */
export interface ImportKind<Row> {
  columns: { required: readonly string[]; optional: readonly string[] };
  /** Takes every column as text (an absent column as `""`); an issue's path is the column, its message what was expected. */
  row: z.ZodType<Row, Record<string, string>>;
}
