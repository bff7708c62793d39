import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { formatNumber } from "~/utils/format/format-number";

/** `2 new, 1 changed, 40 unchanged.` with what would be refused or removed. */
export function sayCounts({ counts, rows }: Pick<ImportAnswer, "counts" | "rows">): string {
  if (rows.length === 0 && counts.removed === 0) return "The file has a header and no rows.";
  const words = [
    [counts.refused, "refused"],
    [counts.new, "new"],
    [counts.changed, "changed"],
    [counts.removed, counts.removed === 1 ? "line removed" : "lines removed"],
    [counts.same, "unchanged"],
  ] as const;
  const said = words.filter(([count]) => count > 0).map(([count, word]) => `${formatNumber(count)} ${word}`);
  return `${said.join(", ")}.`;
}
