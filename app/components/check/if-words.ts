import { type If, parseIf } from "~/schemas/planning/if-text";
import { formatDate } from "~/utils/format/format-date";
import { formatNumber } from "~/utils/format/format-number";

/** A change to try in words: `2 more of HB-2041`. */
export function ifWords(text: string, today: string | undefined): string {
  const change = parseIf(text);
  return change === null ? text : say(change, (day) => sayDay(day, today));
}

function sayDay(day: string, today: string | undefined): string {
  return /^\d{4}-\d{2}-\d{2}$/.test(day) ? formatDate(day, { today }) : day;
}

function say(change: If, date: (day: string) => string): string {
  switch (change.kind) {
    case "stock": {
      const isLess = change.change.startsWith("-");
      const amount = formatNumber(change.change.replace(/^[+-]/, ""));
      return `${amount} ${isLess ? "fewer" : "more"} of ${change.partNumber} in stock`;
    }
    case "hold":
      return change.lot === ""
        ? `all ${change.partNumber} held`
        : `lot ${change.lot} of ${change.partNumber} held`;
    case "order":
      return `${change.reference} comes on ${date(change.due)}`;
    case "arrival":
      return `${formatNumber(change.quantity)} of ${change.partNumber} come on ${date(change.due)}`;
    case "lead":
      return `${change.partNumber} takes ${change.days} ${change.days === "1" ? "day" : "days"}`;
    case "cost":
      return `${change.partNumber} costs ${change.cost}`;
  }
}
