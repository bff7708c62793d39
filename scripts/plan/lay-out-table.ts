export interface TableColumn<Row> {
  head: string;
  cell: (row: Row) => string;
  /** Figures stand on the right, so that their points line up. */
  right?: boolean;
}

/** A titled table in plain text; nothing for no rows. */
export function layOutTable<Row>(
  title: string,
  rows: readonly Row[],
  columns: readonly TableColumn<Row>[],
): string[] {
  if (rows.length === 0) return [];
  const grid = [
    columns.map((column) => column.head),
    ...rows.map((row) => columns.map((column) => column.cell(row))),
  ];
  const widths = columns.map((_, at) => grid.reduce((widest, line) => Math.max(widest, line[at].length), 0));
  const lines = grid.map((line) =>
    line
      .map((cell, at) => (columns[at].right ? cell.padStart(widths[at]) : cell.padEnd(widths[at])))
      .join("  ")
      .trimEnd(),
  );
  return ["", title, ...lines.map((line) => `  ${line}`)];
}
