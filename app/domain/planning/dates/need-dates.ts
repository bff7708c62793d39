import type { PassState } from "../netting/pass-state";
import type { Segment } from "../netting/split-demand";
import type { Structure } from "../structure/structure";
import { MAKE } from "../structure/structure";

/** No date asks for the part. */
export const NEVER = 0x7fffffff;

/**
 * Takes a dated demand in: the day each part directly under its kit, or under an open phantom of it, is
 * needed by (PLANNING.md, section 5). Open parts are worked out for these kits alone, since options are.
 */
export function needForSegment(
  structure: Structure,
  base: PassState,
  state: PassState,
  segment: Segment,
  needBy: Int32Array,
): void {
  const { part, due } = segment;
  if (due === null) return;
  const { fixed, conditional, open, openParts } = structure;
  needBy[part] = Math.min(needBy[part], due);
  const own = new Map<number, number>([[part, due]]);
  for (const p of openParts) {
    const day = own.get(p);
    if (day === undefined || !(state.start[p] > base.start[p])) continue;
    const wanted = beforeBuild(structure, p, day);
    const ask = (component: number) => {
      needBy[component] = Math.min(needBy[component], wanted);
      if (open[component]) own.set(component, Math.min(own.get(component) ?? NEVER, wanted));
    };
    for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) if (fixed.num[k] > 0) ask(fixed.component[k]);
    for (let k = conditional.starts[p]; k < conditional.starts[p + 1]; k++) {
      if (segment.active[k] && conditional.num[k] > 0) ask(conditional.component[k]);
    }
  }
}

/** Carries the days on from the parts under the kits down to every component of what is built. */
export function spreadNeed(structure: Structure, state: PassState, needBy: Int32Array): void {
  const { fixed, open } = structure;
  for (let p = 0; p < needBy.length; p++) {
    if (needBy[p] === NEVER || open[p] || !(state.start[p] > 0)) continue;
    const wanted = beforeBuild(structure, p, needBy[p]);
    for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
      const component = fixed.component[k];
      if (fixed.num[k] > 0 && wanted < needBy[component]) needBy[component] = wanted;
    }
  }
}

function beforeBuild(structure: Structure, part: number, day: number): number {
  return structure.sourcing[part] === MAKE ? day - structure.leadTime[part] : day;
}
