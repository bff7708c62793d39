import type { PassState } from "../netting/pass-state";
import type { Structure } from "../structure/structure";
import { MAKE } from "../structure/structure";

/** No date asks for the part. */
export const NEVER = 0x7fffffff;

/** The earliest days over the demands, by part number of the structure. */
export interface NeedDates {
  needBy: Int32Array;
  orderBy: Int32Array;
}

/** Demands that are alike, served one after another: `state` is `base` and their kits on top. */
export interface NeedGroup {
  part: number;
  /** Day number, or null. */
  due: number | null;
  base: PassState;
  state: PassState;
}

/** No demand taken in yet. */
export function emptyNeeds(structure: Structure): NeedDates {
  const parts = structure.parts.length;
  return { needBy: new Int32Array(parts).fill(NEVER), orderBy: new Int32Array(parts).fill(NEVER) };
}

/**
 * Takes demands in: when their parts are needed and what is short for them must be ordered (PLANNING.md,
 * section 5). Only what they themselves build, and lack, counts.
 */
export function addNeeds(structure: Structure, group: NeedGroup, today: number, needs: NeedDates): void {
  const { due, base, state } = group;
  const own = due === null ? null : needOfGroup(structure, group, due);
  for (let p = 0; p < structure.leaf.length; p++) {
    const wanted = own === null ? NEVER : own[p];
    if (wanted < needs.needBy[p]) needs.needBy[p] = wanted;
    if (!structure.leaf[p] || !(state.net[p] > base.net[p])) continue;
    const order = own === null ? today : wanted - structure.leadTime[p];
    if (order < needs.orderBy[p]) needs.orderBy[p] = order;
  }
}

function needOfGroup(structure: Structure, { part, base, state }: NeedGroup, due: number): Int32Array {
  const { fixed, conditional, sourcing, leadTime } = structure;
  const needBy = new Int32Array(structure.parts.length).fill(NEVER);
  needBy[part] = due;
  for (let p = part; p < needBy.length; p++) {
    if (needBy[p] === NEVER || !(state.start[p] > base.start[p])) continue;
    const wanted = sourcing[p] === MAKE ? needBy[p] - leadTime[p] : needBy[p];
    for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
      const component = fixed.component[k];
      if (wanted < needBy[component] && fixed.num[k] > 0) needBy[component] = wanted;
    }
    for (let k = conditional.starts[p]; k < conditional.starts[p + 1]; k++) {
      const component = conditional.component[k];
      const isTaken = state.throughLine[k] > base.throughLine[k] && conditional.num[k] > 0;
      if (isTaken && wanted < needBy[component]) needBy[component] = wanted;
    }
  }
  return needBy;
}
