import Papa from "papaparse";
import { guardTextCell } from "./formula-cell";

/** One column of an export. */
export interface CsvColumn<Row> {
  name: string;
  /** Empty where there is nothing to say. Quantities come as decimal strings. */
  cell: (row: Row) => string | number | boolean | null;
}

/** A number, a date or a moment: never taken for a formula, so it stays what it is. */
const FIGURE = /^-?\d+(?:\.\d+)?$|^\d{4}-\d{2}-\d{2}(?:T[\d:.]+Z)?$/;

function toText(value: string | number | boolean | null): string {
  if (value === null) return "";
  if (typeof value === "boolean") return value ? "1" : "0";
  const text = String(value);
  return FIGURE.test(text) ? text : guardTextCell(text);
}

function toLines(rows: readonly (readonly string[])[]): string {
  return rows.length === 0 ? "" : `${Papa.unparse([...rows] as string[][], { newline: "\r\n" })}\r\n`;
}

/** The header line of an export, with its line end. */
export function csvHeader<Row>(columns: readonly CsvColumn<Row>[]): string {
  return toLines([columns.map(({ name }) => name)]);
}

/** The lines of some rows (RFC 4180, commas, CR LF), with text that looks like a formula made harmless. */
export function csvLines<Row>(columns: readonly CsvColumn<Row>[], rows: readonly Row[]): string {
  return toLines(rows.map((row) => columns.map(({ cell }) => toText(cell(row)))));
}

/** A whole file: header and lines. */
export function writeCsv<Row>(columns: readonly CsvColumn<Row>[], rows: readonly Row[]): string {
  return csvHeader(columns) + csvLines(columns, rows);
}
