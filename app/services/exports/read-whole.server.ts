import { readRows } from "~/db/read-rows.server";
import { trimDecimal } from "~/utils/format/trim-decimal";
import type { ExportRow, ExportTable } from "./export-table";

/** Reads a table of the book with one statement whose columns are named as in the file; `decimals` lose empty zeros. */
export function readWhole(statement: string, decimals: readonly string[] = []): ExportTable["read"] {
  return async function* (transaction) {
    const rows = await readRows<ExportRow>(statement, {}, transaction);
    for (const row of rows) trimDecimals(row, decimals);
    yield rows;
  };
}

/** Takes the zeros that say nothing off the stored decimals of a row. */
export function trimDecimals(row: ExportRow, decimals: readonly string[]): void {
  for (const name of decimals) {
    const value = row[name];
    if (typeof value === "string") row[name] = trimDecimal(value);
  }
}
