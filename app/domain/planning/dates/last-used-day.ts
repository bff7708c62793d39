import type { Steps } from "../../quantity/steps";
import { addSteps } from "../../quantity/steps";
import type { Pool } from "../netting/pool";

/** Day of the last open order that covers the first `used` steps, earliest orders first. */
export function lastUsedDay(orders: Pool, part: number, used: Steps): number {
  const buckets = orders.buckets.get(part) ?? [];
  let covered: Steps = 0;
  for (const bucket of buckets) {
    covered = addSteps(covered, bucket.quantity);
    if (covered >= used) return bucket.day;
  }
  throw new Error("More on order is used than there is.");
}
