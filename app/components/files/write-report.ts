import type { ImportAnswer, ImportLine } from "~/schemas/imports/import-answer";
import { type CsvColumn, writeCsv } from "~/utils/csv/write-csv";

const COLUMNS: CsvColumn<ImportLine>[] = [
  { name: "line", cell: (row) => row.line },
  { name: "result", cell: (row) => row.result },
  { name: "what", cell: (row) => [...row.errors.map(({ message }) => message), ...row.notes].join(" ") },
  { name: "before", cell: (row) => row.before && JSON.stringify(row.before) },
  { name: "after", cell: (row) => row.after && JSON.stringify(row.after) },
];

/** The report on a file: one line a row of it. */
export function writeReport({ rows }: ImportAnswer): string {
  return writeCsv(COLUMNS, rows);
}
