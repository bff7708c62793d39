import Papa from "papaparse";
import type { CsvProblem } from "./csv-problem";
import { type CsvEncoding, decodeCsv } from "./decode-csv";
import { type CsvDelimiter, detectDelimiter } from "./detect-delimiter";
import { placeCells } from "./place-cells";

/** One record of the file. Cells are text as it stands, never interpreted. */
export interface CsvRow {
  /** Physical line on which the row starts, from 1. */
  line: number;
  cells: string[];
  /** Physical line of each cell where quoted line breaks put them on different ones. */
  cellLines: number[] | null;
}

export type CsvTable =
  | { ok: true; encoding: CsvEncoding; delimiter: CsvDelimiter; header: CsvRow; rows: CsvRow[] }
  | { ok: false; problems: CsvProblem[] };

/** 20 MB, the most that an import takes. */
const csvByteLimit = 20_000_000;

const mostProblems = 20;

interface Reading {
  text: string;
  delimiter: CsvDelimiter;
  /** Offset and physical line of the row that comes next. */
  at: number;
  line: number;
  rows: CsvRow[];
  problems: CsvProblem[];
}

function columnName(reading: Reading, cell: number): string {
  return reading.rows[0]?.cells[cell]?.trim() || String(cell + 1);
}

function lineAt(text: string, offset: number): number {
  return text.slice(0, offset).split("\n").length;
}

function cellAt({ text, delimiter, at }: Reading, offset: number): number {
  return (
    text
      .slice(at, offset)
      .replaceAll(/"(?:[^"]|"")*"/g, "")
      .split(delimiter).length - 1
  );
}

function quoteProblem(reading: Reading, error: Papa.ParseError): CsvProblem {
  const offset = error.index ?? reading.at;
  const found =
    error.code === "MissingQuotes"
      ? "a quote that opens here and is never closed (unclosed quote)"
      : "a quote that opens here and is not closed before a delimiter or line end (unclosed quote)";
  const column = columnName(reading, cellAt(reading, offset));
  return {
    line: lineAt(reading.text, offset),
    column,
    value: reading.text.slice(offset, offset + 40),
    found,
    expected: "a closing quote; a quote inside a quoted cell is written twice",
  };
}

function widthProblem(reading: Reading, row: CsvRow): CsvProblem | null {
  const header = reading.rows[0];
  if (header === undefined || row.cells.length === header.cells.length) return null;
  const tooMany = row.cells.length > header.cells.length;
  const cell = Math.min(row.cells.length, header.cells.length);
  return {
    line: row.line,
    column: columnName(reading, cell),
    value: row.cells[cell] ?? null,
    found: `${row.cells.length} cells (too ${tooMany ? "many" : "few"})`,
    expected: `${header.cells.length} cells, as in the header; a cell with a delimiter in it is put in quotes`,
  };
}

/** Takes the row that the parser has just read; says whether to go on. */
function takeRow(
  reading: Reading,
  cells: string[],
  end: number,
  error: Papa.ParseError | undefined,
): boolean {
  if (error) {
    reading.problems.push(quoteProblem(reading, error));
    return false;
  }
  const raw = reading.text.slice(reading.at, end);
  const row: CsvRow = { line: reading.line, cells, cellLines: null };
  if (raw.includes('"')) {
    const placed = placeCells(raw, cells, reading.delimiter, reading.line);
    if (!placed.ok) {
      const { cell, line, found } = placed;
      const expected = "the whole cell in quotes, with each quote inside it written twice";
      reading.problems.push({
        line,
        column: columnName(reading, cell),
        value: cells[cell] ?? null,
        found,
        expected,
      });
      return false;
    }
    if (raw.trimEnd().includes("\n")) row.cellLines = placed.cellLines;
  }
  reading.line += raw.split("\n").length - 1;
  reading.at = end;
  if (cells.length === 1 && cells[0].trim() === "" && !raw.includes('"')) return true;
  const problem = widthProblem(reading, row);
  if (problem) reading.problems.push(problem);
  else reading.rows.push(row);
  return reading.problems.length < mostProblems;
}

function readRows(text: string): Reading {
  const delimiter = detectDelimiter(text);
  const reading: Reading = { text, delimiter, at: 0, line: 1, rows: [], problems: [] };
  Papa.parse<string[]>(text, {
    delimiter,
    newline: "\n",
    step: ({ data, errors, meta }, parser) => {
      if (!takeRow(reading, data, meta.cursor, errors[0])) parser.abort();
    },
  });
  return reading;
}

function refuse(found: string, expected: string, line: number | null = null): CsvTable {
  return { ok: false, problems: [{ line, column: null, value: null, found, expected }] };
}

/**
 * Reads a CSV file (RFC 4180) with comma, semicolon or tab in UTF-8, UTF-16 with its mark, or Windows-1252, and
 * says which. Blank lines are skipped; line breaks inside quoted cells become `\n`. What is wrong comes back as
 * problems with line and column, never as an exception.
 */
export function readCsv(bytes: Uint8Array, { byteLimit = csvByteLimit } = {}): CsvTable {
  if (bytes.length > byteLimit) {
    return refuse(`${bytes.length} bytes`, `at most ${byteLimit} bytes; split the file`);
  }
  const decoded = decodeCsv(bytes);
  if (!decoded.ok) return { ok: false, problems: [decoded.problem] };
  const text = decoded.text.replaceAll(/\r\n?/g, "\n");
  const nul = text.indexOf("\0");
  if (nul !== -1) return refuse("a NUL byte", "text only", lineAt(text, nul));
  const { delimiter, rows, problems } = readRows(text);
  if (problems.length > 0) return { ok: false, problems };
  const [header, ...body] = rows;
  if (header === undefined) return refuse("an empty file", "a first line that names the columns", 1);
  return { ok: true, encoding: decoded.encoding, delimiter, header, rows: body };
}
