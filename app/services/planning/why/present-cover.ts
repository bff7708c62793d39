import { isoDate } from "~/domain/planning/dates/day-number";
import { explainCover, type Taken } from "~/domain/planning/explain-cover";
import { formatSteps } from "~/domain/quantity/format-steps";
import type { WhyAnswer, WhyCover } from "~/schemas/planning/why";
import type { TriedBook } from "~/services/planning/try-what-if.server";
import type { Pass } from "./present-need";

/** Which lots and which open orders cover a part. */
export function presentCover(
  pass: Pass,
  { rows }: Pick<TriedBook, "rows">,
  asked: { part: number; with: WhyAnswer["with"] },
): Pick<WhyAnswer, "lots" | "orders"> {
  const { part } = asked;
  const { decimals } = pass.show(part);
  const cover = explainCover(pass.plan, part);
  const lots = asked.with === "stock" ? cover.now : cover.coming;
  const present = (taken: Taken, name: string | null | undefined): WhyCover => ({
    name: name || null,
    used: formatSteps(taken.used, decimals),
    day: Number.isFinite(taken.day) ? isoDate(taken.day) : null,
    flag: taken.flag,
  });
  const isUsed = ({ used }: Taken) => used > 0;
  return {
    lots: lots?.filter(isUsed).map((taken) => present(taken, rows.stock[taken.row].lot)) ?? null,
    orders:
      asked.with === "stock"
        ? []
        : cover.orders.filter(isUsed).map((taken) => present(taken, rows.orders[taken.row].reference)),
  };
}
