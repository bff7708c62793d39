import type { Supplies } from "../compile-supplies";
import type { PassState } from "../netting/pass-state";
import type { Segment } from "../netting/split-demand";
import type { Structure } from "../structure/structure";
import { PHANTOM } from "../structure/structure";
import { lastUsedDay } from "./last-used-day";

/**
 * The day each part is there for its total need (PLANNING.md, section 5), by part number, for the pass
 * with every open order. Conditional lines do not count here: `readyForSegment` adds them for the kits.
 */
export function readyDates(
  structure: Structure,
  supplies: Supplies,
  state: PassState,
  ready: Int32Array,
): void {
  const { fixed, leaf, leadTime, sourcing } = structure;
  const { onOrder, net, start } = state;
  for (let p = ready.length - 1; p >= 0; p--) {
    let day = supplies.today;
    if (onOrder[p] > 0) day = Math.max(day, lastUsedDay(supplies.orders, p, onOrder[p]));
    if (leaf[p]) {
      if (net[p] > 0) day = Math.max(day, supplies.today + leadTime[p]);
    } else if (start[p] > 0) {
      let latest = supplies.today;
      for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
        if (ready[fixed.component[k]] > latest && fixed.num[k] > 0) latest = ready[fixed.component[k]];
      }
      day = Math.max(day, sourcing[p] === PHANTOM ? latest : latest + leadTime[p]);
    }
    ready[p] = day;
  }
}

/**
 * Puts the days of the open parts (kits, and phantoms only under them) as these kits alone see them into
 * `ready`: their own options and serials, and only sources that they use beyond what was served before.
 */
export function readyForSegment(
  structure: Structure,
  supplies: Supplies,
  base: PassState,
  state: PassState,
  segment: Segment,
  ready: Int32Array,
): void {
  const { fixed, conditional, leadTime, sourcing, openParts } = structure;
  for (let at = openParts.length - 1; at >= 0; at--) {
    const p = openParts[at];
    if (structure.leaf[p]) continue;
    let day = supplies.today;
    if (state.onOrder[p] > base.onOrder[p]) {
      day = Math.max(day, lastUsedDay(supplies.orders, p, state.onOrder[p]));
    }
    if (state.start[p] > base.start[p]) {
      let latest = supplies.today;
      for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
        if (fixed.num[k] > 0) latest = Math.max(latest, ready[fixed.component[k]]);
      }
      for (let k = conditional.starts[p]; k < conditional.starts[p + 1]; k++) {
        if (segment.active[k] && conditional.num[k] > 0) {
          latest = Math.max(latest, ready[conditional.component[k]]);
        }
      }
      day = Math.max(day, sourcing[p] === PHANTOM ? latest : latest + leadTime[p]);
    }
    ready[p] = day;
  }
}
