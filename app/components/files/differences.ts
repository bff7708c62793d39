import type { ImportLine } from "~/schemas/imports/import-answer";

interface Change {
  field: string;
  /** null on a new row, which has only what it brings. */
  before: string | null;
  after: string;
}

/** `leadTimeDays` as people write it. */
function fieldWords(name: string): string {
  return name.replaceAll(/[A-Z]/g, (letter) => ` ${letter.toLowerCase()}`);
}

function say(value: unknown): string {
  if (value === null || value === undefined || value === "") return "nothing";
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (Array.isArray(value)) return value.length === 0 ? "nothing" : value.map(say).join(", ");
  if (typeof value === "object") return Object.values(value).map(say).join(" ");
  return String(value);
}

const NAMES = ["partNumber", "parent", "number", "supplier", "bin"];

/** What a row is about, and what it changes: field by field, before and after. */
export function differences({ before, after }: Pick<ImportLine, "before" | "after">): {
  name: string;
  changes: Change[];
} {
  const now = Object.entries(after ?? {});
  const was: Record<string, unknown> = { ...before };
  const name = say(NAMES.map((field) => now.find(([key]) => key === field)?.[1]).find(Boolean));
  const changes = now
    .filter(([field, value]) => {
      if (say(value) === name) return false;
      return before === null ? say(value) !== "nothing" : say(was[field]) !== say(value);
    })
    .map(([field, value]) => ({
      field: fieldWords(field),
      before: before === null ? null : say(was[field]),
      after: say(value),
    }));
  return { name, changes };
}
