import type { Steps } from "../../quantity/steps";
import { addSteps, leastSteps, subtractSteps } from "../../quantity/steps";
import type { Amounts, Engine, PassState } from "./pass-state";

/** A lot with its last usable day, or an open order with its day. */
export interface Bucket {
  day: number;
  quantity: Steps;
  flag: "overdue" | "undated" | null;
  /** Index of the row it was made of. */
  row: number;
}

/** Stock or open orders of all parts: totals, and the buckets of those parts for which the day matters. */
export interface Pool {
  /** By part number, all buckets together: doubles, or a plain array where one passes 2^53. */
  totals: Amounts;
  /** Sorted by day: first expired first out, earliest order first. */
  buckets: Map<number, Bucket[]>;
}

/** What is left in each bucket while demands are served one after another. */
export type Left = Map<number, Steps[]>;

/** Nothing taken yet. */
export function fullBuckets(pool: Pool): Left {
  const left: Left = new Map();
  for (const [part, buckets] of pool.buckets)
    left.set(
      part,
      buckets.map((bucket) => bucket.quantity),
    );
  return left;
}

/** What is left, apart from what is taken later. */
export function copyLeft(left: Left): Left {
  return new Map([...left].map(([part, quantities]) => [part, [...quantities]]));
}

/** What the next demand may take, by part: only buckets whose day it admits. */
export function available(
  pool: Pool,
  left: Left,
  used: Amounts,
  engine: Engine,
  admits: (day: number) => boolean,
): Amounts {
  const amounts = engine.subtract(pool.totals, used);
  for (const [part, buckets] of pool.buckets) {
    const quantities = left.get(part) as Steps[];
    let sum: Steps = 0;
    for (let k = 0; k < buckets.length; k++) if (admits(buckets[k].day)) sum = addSteps(sum, quantities[k]);
    amounts[part] = engine.from(sum);
  }
  return amounts;
}

/** Takes what a demand used out of the buckets it admits, in their order. */
export function takeFrom(
  pool: Pool,
  left: Left,
  before: PassState["fromStock"],
  after: PassState["fromStock"],
  admits: (day: number) => boolean,
): void {
  for (const [part, buckets] of pool.buckets) {
    let wanted = subtractSteps(after[part], before[part]);
    const quantities = left.get(part) as Steps[];
    for (let k = 0; k < buckets.length && wanted > 0; k++) {
      if (!admits(buckets[k].day)) continue;
      const taken = leastSteps(wanted, quantities[k]);
      quantities[k] = subtractSteps(quantities[k], taken);
      wanted = subtractSteps(wanted, taken);
    }
  }
}
