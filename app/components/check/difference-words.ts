import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { formatDate } from "~/utils/format/format-date";
import { formatMoney } from "~/utils/format/format-money";
import { formatNumber } from "~/utils/format/format-number";

/** What the changes that are tried do to the answer, in one sentence; null where nothing is tried. */
export function differenceWords({
  answer,
  without,
}: Pick<CheckPageAnswer, "answer" | "without">): string | null {
  const demand = answer?.demand[0];
  if (!answer || !demand || without === null) return null;
  const date = (day: string) => (day <= answer.today ? "today" : formatDate(day, { today: answer.today }));
  const count = (kits: number | null) => (kits === null ? "any number" : formatNumber(kits));
  const cost = answer.ladder.at(-1)?.cost ?? null;
  const changes = [
    demand.buildable === without.buildable
      ? null
      : `${count(demand.buildable)} from what is here instead of ${count(without.buildable)}`,
    demand.earliest === without.earliest
      ? null
      : `all ${formatNumber(demand.quantity)} by ${date(demand.earliest)} instead of ${date(without.earliest)}`,
    cost === null || without.cost === null || cost === without.cost
      ? null
      : `${formatMoney(cost)} more in parts instead of ${formatMoney(without.cost)}`,
  ].filter((change) => change !== null);
  if (changes.length === 0) return "With these changes the answer is the same.";
  return `With these changes: ${changes.join(", ")}.`;
}
