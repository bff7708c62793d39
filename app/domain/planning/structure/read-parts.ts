import type { PlanPart } from "../types";
import { storeRatio } from "./group-lines";
import { yieldRatio } from "./line-ratio";
import type { Ratio, Structure } from "./structure";
import { BUY, MAKE, PHANTOM } from "./structure";

const SOURCING = { buy: BUY, make: MAKE, phantom: PHANTOM };

type PartFacts = Pick<
  Structure,
  "parts" | "level" | "sourcing" | "decimals" | "leadTime" | "yieldNum" | "yieldDen" | "wideYield"
>;

/** What planning takes of each part, in arrays by the parts' new numbers: `order` is the old place of each. */
export function readParts(parts: readonly PlanPart[], order: Int32Array, levels: Int32Array): PartFacts {
  const ordered = new Array<PlanPart>(parts.length);
  const level = new Int32Array(parts.length);
  const sourcing = new Uint8Array(parts.length);
  const decimals = new Uint8Array(parts.length);
  const leadTime = new Int32Array(parts.length);
  const yieldNum = new Float64Array(parts.length).fill(1);
  const yieldDen = new Float64Array(parts.length).fill(1);
  const wideYield = new Map<number, Ratio>();
  for (let p = 0; p < order.length; p++) {
    const part = parts[order[p]];
    ordered[p] = part;
    level[p] = levels[order[p]];
    sourcing[p] = SOURCING[part.sourcing];
    decimals[p] = part.decimals;
    leadTime[p] = part.leadTimeDays;
    if (sourcing[p] !== MAKE || part.yield === "1") continue;
    storeRatio({ num: yieldNum, den: yieldDen, wide: wideYield }, p, yieldRatio(part.yield));
  }
  return { parts: ordered, level, sourcing, decimals, leadTime, yieldNum, yieldDen, wideYield };
}
