import { formatSteps } from "../quantity/format-steps";
import { requireSteps } from "../quantity/parse-steps";
import { leastSteps, type Steps, subtractSteps } from "../quantity/steps";
import { partKey } from "./part-key";
import type { DecimalString, PlanStock } from "./types";

const FINEST = 6;

/**
 * Marks stock that is promised to an unfinished build but still lies in its bin as `nowOnly`: usable in
 * the pass *now*, left to the build in the pass *coming*. Lots that expire last are taken as promised
 * first, so that the plan counts on the ones that have to be used first.
 */
export function splitPromised(
  stock: readonly PlanStock[],
  promised: readonly { partNumber: string; quantity: DecimalString }[],
): PlanStock[] {
  const left = new Map<string, Steps>();
  for (const { partNumber, quantity } of promised)
    left.set(partKey(partNumber), requireSteps(quantity, FINEST));
  const split: PlanStock[] = [];
  for (const row of [...stock].sort(lastToExpireFirst)) {
    const key = partKey(row.partNumber);
    const wanted = left.get(key) ?? 0;
    const here = requireSteps(row.quantity, FINEST);
    const kept = leastSteps(wanted, here);
    if (!(kept > 0)) {
      split.push(row);
      continue;
    }
    left.set(key, subtractSteps(wanted, kept));
    split.push({ ...row, quantity: trim(kept), nowOnly: true });
    const rest = subtractSteps(here, kept);
    if (rest > 0) split.push({ ...row, quantity: trim(rest) });
  }
  return split;
}

function lastToExpireFirst(a: PlanStock, b: PlanStock): number {
  const [left, right] = [a.expiresOn ?? "9999-12-31", b.expiresOn ?? "9999-12-31"];
  return left < right ? 1 : left > right ? -1 : 0;
}

function trim(steps: Steps): DecimalString {
  return formatSteps(steps, FINEST).replace(/\.?0+$/, "");
}
