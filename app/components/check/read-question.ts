import type { CheckQuestion } from "~/schemas/planning/check-answer";

export const MOST_KITS = 1000;

/** The question in an address; what it does not say is taken from `asked`, the question the server answered. */
export function readQuestion(search: URLSearchParams, asked: CheckQuestion): CheckQuestion {
  if (!search.has("kit") && !search.has("quantity")) return asked;
  return {
    kit: search.get("kit") || asked.kit,
    quantity: readKitCount(search.get("quantity") ?? "") ?? asked.quantity,
    by: readDay(search.get("by"), asked.by),
    options: search
      .getAll("options")
      .flatMap((codes) => codes.split(","))
      .filter((code) => code !== ""),
    ifs: search.getAll("if"),
  };
}

/** Typed text to a number of kits from 1 to 1,000; null when it is none. */
export function readKitCount(text: string): number | null {
  const count = /^\d{1,4}$/.test(text.trim()) ? Number(text) : 0;
  return count >= 1 && count <= MOST_KITS ? count : null;
}

/** A day of the calendar, or none; `asked` where the text is neither. */
function readDay(text: string | null, asked: string | null): string | null {
  if (!text) return null;
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return asked;
  const day = new Date(`${text}T00:00:00Z`);
  return Number.isNaN(day.getTime()) || day.toISOString().slice(0, 10) !== text ? asked : text;
}
