import type { ImportKind } from "~/schemas/imports/import-kind";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { readTextCell } from "~/utils/csv/formula-cell";
import { type HeaderMap, mapHeaders } from "~/utils/csv/map-headers";
import { matchColumns } from "~/utils/csv/match-columns";
import { type CsvRow, readCsv } from "~/utils/csv/read-csv";

/** One row of a file, typed, with the place and text of its cells for what is found wrong later. */
export interface ImportRow<Row> {
  value: Row;
  line: number;
  /** What a problem says about a cell of this row: its line, its column and its text. */
  at: (column: string) => Pick<CsvProblem, "line" | "column" | "value">;
}

/** A row whose cells were refused one by one. */
export interface RefusedRow {
  line: number;
  problems: CsvProblem[];
}

export type ImportRows<Row> =
  | {
      ok: true;
      rows: ImportRow<Row>[];
      refused: RefusedRow[];
      /** The columns that the file has. */
      names: string[];
      encoding: string;
      delimiter: string;
    }
  /** The file as a whole cannot be read. */
  | { ok: false; problems: CsvProblem[] };

function placeOf(names: readonly string[], row: CsvRow): ImportRow<unknown>["at"] {
  return (column) => {
    const cell = names.indexOf(column);
    return { line: row.cellLines?.[cell] ?? row.line, column, value: cell < 0 ? null : row.cells[cell] };
  };
}

/** Reads bytes as rows of one kind, their headers matched by hand where `headers` says so. Refused rows are told apart, so that all of them can be shown at once. */
export function readImportRows<Row>(
  bytes: Uint8Array,
  kind: ImportKind<Row>,
  headers: HeaderMap = {},
): ImportRows<Row> {
  const read = readCsv(bytes);
  if (!read.ok) return read;
  const table = mapHeaders(read, headers);
  const columns = matchColumns(table.header, kind.columns);
  if (!columns.ok) return columns;
  const { names } = columns;
  const empty = [...kind.columns.required, ...kind.columns.optional].map((name) => [name, ""] as const);
  const rows: ImportRow<Row>[] = [];
  const refused: RefusedRow[] = [];
  for (const row of table.rows) {
    const cells: Record<string, string> = Object.fromEntries(empty);
    for (const [cell, name] of names.entries()) cells[name] = readTextCell(row.cells[cell]);
    const at = placeOf(names, row);
    const parsed = kind.row.safeParse(cells);
    if (parsed.success) {
      rows.push({ value: parsed.data, line: row.line, at });
    } else {
      const problems = parsed.error.issues.map((issue) => ({
        ...at(String(issue.path[0])),
        expected: issue.message,
      }));
      refused.push({ line: row.line, problems });
    }
  }
  return { ok: true, rows, refused, names, encoding: table.encoding, delimiter: table.delimiter };
}
