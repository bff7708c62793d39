import { requireDecimal } from "../../quantity/parse-decimal";
import { roundHalfUp } from "../../quantity/round-half-up";
import type { Steps } from "../../quantity/steps";
import type { Structure } from "../structure/structure";

/** Sum of quantity x unit cost, rounded once, half up, to two decimals. Parts without a cost count as 0. */
export function sumCost(structure: Structure, amounts: readonly { part: number; short: Steps }[]): string {
  const byScale = new Map<number, bigint>();
  for (const { part, short } of amounts) {
    const cost = requireDecimal(structure.parts[part].unitCost ?? "0");
    if (cost.digits === 0n) continue;
    const scale = cost.scale + structure.decimals[part];
    byScale.set(scale, (byScale.get(scale) ?? 0n) + BigInt(short) * cost.digits);
  }
  const scale = Math.max(0, ...byScale.keys());
  let digits = 0n;
  for (const [own, sum] of byScale) digits += sum * 10n ** BigInt(scale - own);
  return roundHalfUp({ digits, scale }, 2);
}
