import type { Steps } from "../../quantity/steps";
import { addSteps, narrowSteps } from "../../quantity/steps";
import type { Lane, Offer } from "./lane";
import { tryKits } from "./lane";
import type { PassState } from "./pass-state";
import type { Segment } from "./split-demand";

interface FirstStopsInput {
  lane: Lane;
  offer: Offer;
  segment: Segment;
  /** Kits of the segment that have a rung already. */
  rungs: number;
  served: Steps;
  stopsAt: Map<number, Steps>;
  before: { now: PassState };
}

/**
 * For parts that the segment lacks only past the rungs drawn: the first kit each one stops, by halving.
 * The lane's last try must be the whole segment. Writes into `stopsAt`, counting from `served`.
 */
export function findFirstStops(input: FirstStopsInput): void {
  const { lane, offer, segment, rungs, served, stopsAt, before } = input;
  const { leaf } = lane.structure;
  const old = before.now.net;
  const lacking = lane.engine.grown(leaf, lane.next.net, old).filter((p) => !stopsAt.has(p));
  const open = [{ low: BigInt(rungs), high: BigInt(segment.kits), parts: lacking }];
  for (let range = open.pop(); range; range = open.pop()) {
    const { low, high, parts } = range;
    if (parts.length === 0) continue;
    if (high - low === 1n) {
      for (const part of parts) stopsAt.set(part, addSteps(served, narrowSteps(high)));
      continue;
    }
    const middle = (low + high) / 2n;
    const { net } = tryKits(lane, offer, segment, narrowSteps(middle));
    open.push({ low, high: middle, parts: parts.filter((p) => net[p] > old[p]) });
    open.push({ low: middle, high, parts: parts.filter((p) => !(net[p] > old[p])) });
  }
}
