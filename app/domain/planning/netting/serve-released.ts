import type { Steps } from "../../quantity/steps";
import { addSteps, subtractSteps } from "../../quantity/steps";
import type { Supplies } from "../compile-supplies";
import type { Structure } from "../structure/structure";
import { countBeyond, countShippable } from "./count-shippable";
import type { Lane } from "./lane";
import { keepKits, offerTo, openLane, tryKits } from "./lane";
import type { Engine } from "./pass-state";
import type { Segment, SplitDemand } from "./split-demand";

interface NowInput {
  structure: Structure;
  supplies: Supplies;
  /** Served before all others. */
  first: readonly Segment[];
  engine: Engine;
}

/** The order in which kits go when a later complete one may pass an earlier one that waits. */
export interface ReleasedOrder {
  /** Kits that ship, then those that wait, each in the order asked. */
  segments: Segment[];
  /** Complete kits by demand; null where nothing limits the last one. */
  buildable: (Steps | null)[];
}

/** Takes the kits one by one in their order: each that is complete with what is left ships (section 4). */
export function releaseOrder(input: NowInput & { splits: readonly SplitDemand[] }): ReleasedOrder {
  const { splits } = input;
  const lane = openNowLane(input);
  const ship: Segment[] = [];
  const wait: Segment[] = [];
  const buildable: (Steps | null)[] = [];
  for (const split of splits) {
    let shipped: Steps = 0;
    for (const segment of split.segments) {
      const kits = countShippable(lane, segment, 0, segment.kits);
      if (kits > 0) {
        ship.push({ ...segment, kits });
        serveNow(lane, segment, kits);
      }
      if (kits < segment.kits) wait.push({ ...segment, kits: subtractSteps(segment.kits, kits) });
      shipped = addSteps(shipped, kits);
    }
    buildable.push(shipped);
  }
  const last = splits.length - 1;
  if (!wait.some((segment) => segment.demand === last)) {
    const more = countBeyond(lane, splits[last].beyond);
    buildable[last] = more === null ? null : addSteps(buildable[last] as Steps, more);
  }
  return { segments: [...ship, ...wait], buildable };
}

/** What each demand takes from stock in the pass *now*, by demand and part. */
export function stockTakenByDemand(
  input: NowInput & { segments: readonly Segment[]; demands: number },
): Map<number, Steps>[] {
  const { segments, demands } = input;
  const lane = openNowLane(input);
  const taken = Array.from({ length: demands }, () => new Map<number, Steps>());
  for (const segment of segments) {
    const before = lane.state.fromStock;
    serveNow(lane, segment, segment.kits);
    const after = lane.state.fromStock;
    const own = taken[segment.demand];
    for (let p = 0; p < after.length; p++) {
      const added = subtractSteps(after[p], before[p]);
      if (added > 0) own.set(p, addSteps(own.get(p) ?? 0, added));
    }
  }
  return taken;
}

function openNowLane({ structure, supplies, first, engine }: NowInput): Lane {
  const { stockNow, today } = supplies;
  const lane = openLane({ structure, engine, today, stock: stockNow, orders: null, byDate: false });
  for (const segment of first) serveNow(lane, segment, segment.kits);
  return lane;
}

function serveNow(lane: Lane, segment: Segment, kits: Steps): void {
  tryKits(lane, offerTo(lane, segment), segment, kits);
  keepKits(lane, segment);
}
