import type { ShipCheck } from "~/domain/planning/types";
import type { NaiveAnswer } from "./naive-ship-check";

const byNumber = (a: { partNumber: string }, b: { partNumber: string }) =>
  a.partNumber < b.partNumber ? -1 : 1;

/** The figures of an answer with stoppers in part number order: their own order is a check of its own. */
export function comparable(answer: ShipCheck | NaiveAnswer): NaiveAnswer {
  const { today, demand, buildable, earliest, ladder, shortages, builds } = answer;
  const sorted = ladder.map((rung) => ({ ...rung, stoppers: [...rung.stoppers].sort(byNumber) }));
  return {
    today,
    demand: demand.map((row) => ({ ...row, options: [...row.options].sort() })),
    buildable: Object.fromEntries(Object.entries(buildable)),
    earliest: Object.fromEntries(Object.entries(earliest)),
    ladder: sorted,
    shortages: [...shortages].sort(byNumber),
    builds: [...builds].sort(byNumber),
  };
}
