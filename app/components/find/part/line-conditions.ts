import { formatDate } from "~/utils/format/format-date";

interface Conditions {
  option: string | null;
  fromSerial: string | null;
  toSerial: string | null;
  fromDate?: string | null;
  toDate?: string | null;
}

/** When a structure line counts: empty where it always does. */
export function lineConditions(line: Conditions): string {
  const day = (date: string | null | undefined) => (date ? formatDate(date) : null);
  return [
    line.option !== null && `with option ${line.option}`,
    span("serial", line.fromSerial, line.toSerial),
    span("", day(line.fromDate), day(line.toDate)),
  ]
    .filter(Boolean)
    .join(", ");
}

function span(noun: string, from: string | null, to: string | null): string {
  const words = [noun, from !== null && `from ${from}`, to !== null && `up to ${to}`];
  return from === null && to === null ? "" : words.filter(Boolean).join(" ");
}
