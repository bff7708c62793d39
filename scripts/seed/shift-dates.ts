import Papa from "papaparse";
import { readCsv } from "~/utils/csv/read-csv";

/** The day that the demo firm's files call today. */
const writtenOn = "2026-12-01";

const dayLength = 86_400_000;
const dateColumns = new Set(["due", "expires_on", "wanted_on", "from_date", "to_date", "happened_at"]);
const leadingDate = /^\d{4}-\d{2}-\d{2}/;

function shiftDay(day: string, days: number): string {
  return new Date(Date.parse(day) + days * dayLength).toISOString().slice(0, 10);
}

/** Moves every date of a demo file by the days that have gone by since it was written. */
export function shiftDates(bytes: Uint8Array, today: string): Uint8Array {
  const days = Math.round((Date.parse(today) - Date.parse(writtenOn)) / dayLength);
  if (days === 0) return bytes;
  const table = readCsv(bytes);
  if (!table.ok) return bytes;
  const isDate = table.header.cells.map((name) => dateColumns.has(name));
  const rows = table.rows.map((row) =>
    row.cells.map((cell, at) =>
      isDate[at] ? cell.replace(leadingDate, (day) => shiftDay(day, days)) : cell,
    ),
  );
  return new TextEncoder().encode(Papa.unparse([table.header.cells, ...rows], { newline: "\n" }));
}
