import type { Steps } from "../../quantity/steps";
import { addSteps } from "../../quantity/steps";
import type { Lane } from "./lane";
import { addsNoShortage, keepKits, offerTo, tryKits } from "./lane";
import { largestPassing } from "./largest-passing";
import { isLimited } from "./limits";
import type { Segment } from "./split-demand";

/** How many kits of the segment can be complete after what the lane has served; `most` null has no end. */
export function countShippable(lane: Lane, segment: Segment, low: Steps, most: Steps | null): Steps {
  const offer = offerTo(lane, segment);
  const passes = (kits: Steps) => {
    tryKits(lane, offer, segment, kits);
    return addsNoShortage(lane);
  };
  return largestPassing(low, most, passes);
}

/**
 * How many kits more than asked could be complete, had the last demand no end; null where nothing
 * limits them. Serves them in the lane.
 */
export function countBeyond(lane: Lane, beyond: readonly Segment[]): Steps | null {
  let total: Steps = 0;
  for (const segment of beyond) {
    const endless = segment === beyond[beyond.length - 1];
    if (endless && !isLimited(lane.structure, segment.part, segment.active)) return null;
    const kits = countShippable(lane, segment, 0, endless ? null : segment.kits);
    total = addSteps(total, kits);
    if (endless || kits < segment.kits) return total;
    tryKits(lane, offerTo(lane, segment), segment, kits);
    keepKits(lane, segment);
  }
  return total;
}
