import { z } from "zod";

const shape = /^(\d{4})-(\d{2})-(\d{2})$/;

function daysIn(year: number, month: number): number {
  if (month === 2) return (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0 ? 29 : 28;
  return [4, 6, 9, 11].includes(month) ? 30 : 31;
}

/** Whether the text is a day that the calendar has, written `YYYY-MM-DD`. */
export function isIsoDate(text: string): boolean {
  const match = shape.exec(text);
  if (!match) return false;
  const [year, month, day] = match.slice(1).map(Number);
  return year >= 1 && month >= 1 && month <= 12 && day >= 1 && day <= daysIn(year, month);
}

/** A calendar day. 2026-02-30 is none. */
export const isoDate = z
  .string()
  .transform((text) => text.trim())
  .refine(isIsoDate, "a day of the calendar as YYYY-MM-DD, such as 2026-12-01");
