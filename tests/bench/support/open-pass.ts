import type { Supplies } from "~/domain/planning/compile-supplies";
import { type Lane, offerTo, openLane, tryKits } from "~/domain/planning/netting/lane";
import { numberEngine } from "~/domain/planning/netting/run-pass";
import { splitDemand } from "~/domain/planning/netting/split-demand";
import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanDemand } from "~/domain/planning/types";

/** Kits of one part with no date, serial or option. */
export const plainDemand = (partNumber: string, kits: number): PlanDemand => ({
  partNumber,
  quantity: String(kits),
  due: null,
  options: [],
  serial: null,
});

/** One netting pass from stock, ready to be run for so many kits as often as one likes. */
export function openPass(structure: Structure, supplies: Supplies, partNumber: string) {
  const result = splitDemand(structure, plainDemand(partNumber, 1), 0, supplies.today);
  if (!result.ok) throw new Error(result.problem.code);
  const [segment] = result.split.segments;
  const { today, stockNow: stock } = supplies;
  const lane: Lane = openLane({ structure, engine: numberEngine, today, stock, orders: null, byDate: false });
  const offer = offerTo(lane, segment);
  return { segment, offer, lane, run: (kits: number) => tryKits(lane, offer, segment, kits) };
}
