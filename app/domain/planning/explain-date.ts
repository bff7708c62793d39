import { criticalChain } from "./dates/critical-chain";
import type { ShipPlan } from "./plan-ship";
import type { ChainLink } from "./types";

/**
 * What sets a part's date, from the part down to what everything waits for; its first link bears the date.
 * Empty for a kit, or a phantom under kits alone, that is not on the critical chain: its date differs from
 * kit to kit.
 */
export function explainDate(plan: ShipPlan, part: number): ChainLink[] {
  const { structure, supplies, segments, served } = plan;
  const { partNumber } = structure.parts[part];
  if (structure.open[part] === 1 && !structure.leaf[part]) {
    const at = served.chain.findIndex((link) => link.partNumber === partNumber);
    return at < 0 ? [] : served.chain.slice(at);
  }
  const input = { structure, supplies, segment: segments[0], base: served.all, state: served.all };
  return criticalChain({ ...input, ready: served.ready }, part);
}
