/** One thing that is wrong with a CSV file: where it stands, what was found and what was expected. */
export interface CsvProblem {
  /** Physical line, from 1; null when the file as a whole is meant. */
  line: number | null;
  /** The column's header, or its number where it has none. */
  column: string | null;
  /** The cell as it stands in the file. */
  value: string | null;
  /** What would have been accepted, as a phrase. */
  expected: string;
  /** Says what was found where the value alone would not. */
  found?: string;
  /** The header is none that the kind has: it can be matched by hand. */
  unknownHeader?: true;
}
