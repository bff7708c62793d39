import { sumCost } from "./answer/sum-cost";
import { compileSupplies } from "./compile-supplies";
import { planShip } from "./plan-ship";
import type { Structure } from "./structure/structure";
import type { DecimalString, IsoDate } from "./types";

/**
 * What the bought parts of one unit cost when nothing is on the shelf: every loss by scrap and yield
 * included, each requirement rounded up as the plan does it; two decimals, rounded once. Null where
 * there is no such part, or no such option.
 */
export function rollUpCost(
  structure: Structure,
  partNumber: string,
  options: readonly string[],
  today: IsoDate,
): DecimalString | null {
  const supplies = compileSupplies(structure, [], [], today);
  const demand = [{ partNumber, quantity: "1", due: null, options, serial: null }];
  const result = planShip({ structure, supplies, demand, sharing: "strict" });
  if (!result.ok) return null;
  const { net } = result.plan.served.coming;
  const bought = [...structure.leaf.keys()].filter((p) => structure.leaf[p] === 1 && net[p] > 0);
  return sumCost(
    structure,
    bought.map((part) => ({ part, short: net[part] })),
  );
}
