import type { Supplies } from "../compile-supplies";
import type { PassState } from "../netting/pass-state";
import type { Segment } from "../netting/split-demand";
import type { Structure } from "../structure/structure";
import { PHANTOM } from "../structure/structure";
import type { ChainLink } from "../types";
import { isoDate } from "./day-number";
import { lastUsedDay } from "./last-used-day";

interface ChainInput {
  structure: Structure;
  supplies: Supplies;
  segment: Segment;
  base: PassState;
  state: PassState;
  ready: Int32Array;
}

/**
 * From the kit, or another part, down along the component that sets the date. Where several set it, the one with the
 * smallest part number; where a part has several sources of one day: build, buy, on order, stock.
 */
export function criticalChain(input: ChainInput, from = input.segment.part): ChainLink[] {
  const chain: ChainLink[] = [];
  let part: number | null = from;
  while (part !== null) {
    const { why, next } = step(input, part);
    const { partNumber } = input.structure.parts[part];
    chain.push({ partNumber, why, readyOn: isoDate(input.ready[part]) });
    part = next;
  }
  return chain;
}

function step(input: ChainInput, p: number): { why: ChainLink["why"]; next: number | null } {
  const { structure, supplies, base, state, ready } = input;
  const own = structure.open[p] === 1 && !structure.leaf[p];
  const built = own ? state.start[p] > base.start[p] : state.start[p] > 0;
  const ordered = own ? state.onOrder[p] > base.onOrder[p] : state.onOrder[p] > 0;
  if (built) {
    const next = latestComponent(input, p);
    const days = structure.sourcing[p] === PHANTOM ? 0 : structure.leadTime[p];
    const from = next === null ? supplies.today : Math.max(supplies.today, ready[next]);
    if (from + days === ready[p]) return { why: "build", next };
  }
  if (structure.leaf[p] && state.net[p] > 0 && supplies.today + structure.leadTime[p] === ready[p]) {
    return { why: "buy", next: null };
  }
  if (ordered && lastUsedDay(supplies.orders, p, state.onOrder[p]) === ready[p])
    return { why: "on-order", next: null };
  return { why: "stock", next: null };
}

function latestComponent({ structure, segment, ready }: ChainInput, p: number): number | null {
  let found: number | null = null;
  const consider = (component: number) => {
    if (found === null || ready[component] > ready[found]) found = component;
    else if (ready[component] === ready[found]) {
      if (structure.parts[component].partNumber < structure.parts[found].partNumber) found = component;
    }
  };
  const { fixed, conditional } = structure;
  for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
    if (fixed.num[k] > 0) consider(fixed.component[k]);
  }
  for (let k = conditional.starts[p]; k < conditional.starts[p + 1]; k++) {
    if (segment.active[k] && conditional.num[k] > 0) consider(conditional.component[k]);
  }
  return found;
}
