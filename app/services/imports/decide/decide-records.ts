import type { ImportRow } from "~/services/imports/files/read-import-rows";
import type { Decision } from "~/services/imports/import-job";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { sameValues } from "./same-values";

/** A record of the book in the form of a row. */
export interface StoredRecord<Row> {
  id: number;
  value: Row;
}

/** A record to write; without an id it is a new one. */
export interface RecordChange<Row> {
  id: number | null;
  value: Row;
}

interface Records<Row> {
  rows: readonly ImportRow<Row>[];
  keyOf: (value: Row) => string;
  /** The column that the key stands in, for what is said of doubles. */
  keyColumn: string;
  stored: ReadonlyMap<string, StoredRecord<Row>>;
  columns: ReadonlySet<string>;
  /** What is wrong with a row beside the book. */
  check?: (row: ImportRow<Row>, value: Row) => CsvProblem[];
}

interface DecidedRecords<Row> {
  decisions: Decision[];
  changes: RecordChange<Row>[];
}

function camelCase(column: string): string {
  return column.replaceAll(/_(\w)/g, (_, letter: string) => letter.toUpperCase());
}

/** Takes the row's values under the file's columns, and keeps what is stored under the others. */
function merge<Row extends object>(row: Row, stored: Row | undefined, columns: ReadonlySet<string>): Row {
  if (stored === undefined) return row;
  const given = new Set([...columns].map(camelCase));
  const kept = Object.entries(stored).filter(([field]) => !given.has(field));
  return { ...row, ...Object.fromEntries(kept) };
}

/** Compares rows with the records of the same key: what is new, what changes, and keys that the file has twice. */
export function decideRecords<Row extends object>(records: Records<Row>): DecidedRecords<Row> {
  const { rows, keyOf, keyColumn, stored, columns, check } = records;
  const lines = new Map<string, number>();
  const decisions: Decision[] = [];
  const changes: RecordChange<Row>[] = [];
  for (const row of rows) {
    const key = keyOf(row.value);
    const before = stored.get(key);
    const after = merge(row.value, before?.value, columns);
    const problems = check?.(row, after) ?? [];
    const first = lines.get(key);
    if (first !== undefined) {
      const at = row.at(keyColumn);
      const found = `${JSON.stringify(at.value)}, already on line ${first}`;
      problems.push({ ...at, found, expected: "each one once" });
    }
    lines.set(key, first ?? row.line);
    decisions.push({ row, before: before?.value ?? null, after, problems });
    if (!sameValues(before?.value ?? null, after)) changes.push({ id: before?.id ?? null, value: after });
  }
  return { decisions, changes };
}
