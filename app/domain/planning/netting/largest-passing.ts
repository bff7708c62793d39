import type { Steps } from "../../quantity/steps";
import { narrowSteps } from "../../quantity/steps";

/**
 * The largest whole number from `low` to `high` that passes, where `low` is known to pass and passing
 * never comes back once it has gone. Without `high` it doubles until one fails.
 */
export function largestPassing(low: Steps, high: Steps | null, passes: (count: Steps) => boolean): Steps {
  let good = BigInt(low);
  let bad: bigint;
  if (high === null) {
    let step = good > 0n ? good : 1n;
    while (passes(narrowSteps(good + step))) {
      good += step;
      step *= 2n;
    }
    bad = good + step;
  } else if (passes(high)) return high;
  else bad = BigInt(high);
  while (bad - good > 1n) {
    const middle = (good + bad) / 2n;
    if (passes(narrowSteps(middle))) good = middle;
    else bad = middle;
  }
  return narrowSteps(good);
}
