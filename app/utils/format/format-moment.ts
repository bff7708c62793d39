import { formatDate } from "./format-date";

/** An ISO moment as `1 December 2026, 11:46` in UTC, the same on server and in the browser. */
export function formatMoment(iso: string): string {
  return `${formatDate(iso.slice(0, 10))}, ${iso.slice(11, 16)}`;
}
