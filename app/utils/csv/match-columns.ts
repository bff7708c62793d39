import type { CsvProblem } from "./csv-problem";
import type { CsvRow } from "./read-csv";

export interface ColumnNames {
  required: readonly string[];
  optional: readonly string[];
}

export type MatchedColumns =
  /** `names[i]` is the column of cell i of each row. */
  { ok: true; names: string[] } | { ok: false; problems: CsvProblem[] };

/** Checks a header row against the columns of a kind: unknown, doubled and missing ones are each named. */
export function matchColumns(header: CsvRow, { required, optional }: ColumnNames): MatchedColumns {
  const known = new Set([...required, ...optional]);
  const names = header.cells.map((cell) => cell.trim());
  const seen = new Set<string>();
  const problems: CsvProblem[] = [];
  for (const [cell, name] of names.entries()) {
    const place = {
      line: header.cellLines?.[cell] ?? header.line,
      column: name || String(cell + 1),
      value: name,
    };
    if (!known.has(name)) {
      const found = name === "" ? "a column without a header" : `the unknown header ${JSON.stringify(name)}`;
      problems.push({ ...place, found, expected: `one of ${[...known].join(", ")}`, unknownHeader: true });
    } else if (seen.has(name)) {
      problems.push({ ...place, found: `the header "${name}" twice`, expected: "each header once" });
    }
    seen.add(name);
  }
  for (const name of required) {
    if (seen.has(name)) continue;
    const found = `no header "${name}"`;
    problems.push({ line: header.line, column: name, value: null, found, expected: `the column ${name}` });
  }
  return problems.length === 0 ? { ok: true, names } : { ok: false, problems };
}
