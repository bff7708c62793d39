import type { CsvRow } from "./read-csv";

/** Headers of a file (trimmed) to columns of its kind; an empty one leaves the column out. */
export type HeaderMap = Readonly<Record<string, string>>;

function pick(row: CsvRow, places: readonly number[]): CsvRow {
  const { line, cells, cellLines } = row;
  return {
    line,
    cells: places.map((place) => cells[place]),
    cellLines: cellLines && places.map((place) => cellLines[place]),
  };
}

/** The same table with the headers that were matched by hand, without the columns that were left out. */
export function mapHeaders<Table extends { header: CsvRow; rows: CsvRow[] }>(
  table: Table,
  headers: HeaderMap,
): Table {
  const names = table.header.cells.map((cell) => {
    const name = cell.trim();
    return Object.hasOwn(headers, name) ? headers[name] : name;
  });
  const places = [...names.keys()].filter(
    (place) => !(names[place] === "" && Object.hasOwn(headers, table.header.cells[place].trim())),
  );
  if (Object.keys(headers).length === 0) return table;
  return {
    ...table,
    header: pick({ ...table.header, cells: names }, places),
    rows: places.length === names.length ? table.rows : table.rows.map((row) => pick(row, places)),
  };
}
