import type { CsvDelimiter } from "./detect-delimiter";

/** Where a row's cells start, or the first cell whose quotes break RFC 4180. */
export type PlacedCells =
  | { ok: true; cellLines: number[] }
  | { ok: false; cell: number; line: number; found: string };

function countBreaks(text: string, from: number, to: number): number {
  let breaks = 0;
  for (let at = text.indexOf("\n", from); at !== -1 && at < to; at = text.indexOf("\n", at + 1)) breaks += 1;
  return breaks;
}

function quotedLength(value: string): number {
  return value.length + 2 + (value.split('"').length - 1);
}

/**
 * Walks the raw text of one row beside its parsed cells: gives the physical line of each cell, and refuses
 * what the parser lets pass (a quote inside an unquoted cell, text between a closing quote and the delimiter).
 */
export function placeCells(
  raw: string,
  cells: readonly string[],
  delimiter: CsvDelimiter,
  firstLine: number,
): PlacedCells {
  const cellLines: number[] = [];
  let at = 0;
  let line = firstLine;
  for (const [cell, value] of cells.entries()) {
    cellLines.push(line);
    const quoted = raw[at] === '"';
    if (!quoted && value.includes('"')) {
      return { ok: false, cell, line, found: `a quote inside the unquoted cell ${JSON.stringify(value)}` };
    }
    const end = at + (quoted ? quotedLength(value) : value.length);
    const next = raw[end];
    if (next !== undefined && next !== delimiter && next !== "\n") {
      return { ok: false, cell, line, found: "text after the closing quote of the cell" };
    }
    line += countBreaks(raw, at, end);
    at = end + 1;
  }
  return { ok: true, cellLines };
}
