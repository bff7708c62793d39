import type { IsoDate } from "../types";

/** Days since 1970-01-01 of a calendar date. Throws where the date does not exist. */
export function dayNumber(date: IsoDate): number {
  const time = Date.parse(`${date}T00:00:00Z`);
  if (Number.isNaN(time) || isoDate(time / 86_400_000) !== date) throw new Error(`Not a date: ${date}`);
  return time / 86_400_000;
}

/** The calendar date of a day number. */
export function isoDate(day: number): IsoDate {
  return new Date(day * 86_400_000).toISOString().slice(0, 10);
}
