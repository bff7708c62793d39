import type { PlanLine } from "../types";
import { lineRatio } from "./line-ratio";
import type { LineGroup, QuantityLines, Ratio } from "./structure";

/** The chosen input lines with the numbers of their parts. */
export interface ChosenLines {
  /** Indexes into the input lines, in input order. */
  chosen: Int32Array;
  parent: Int32Array;
  component: Int32Array;
}

/** Groups lines by parent number; within a parent they keep the order of the input. */
export function groupLines(parts: number, { chosen, parent, component }: ChosenLines): LineGroup {
  const starts = new Int32Array(parts + 1);
  for (const line of chosen) starts[parent[line] + 1]++;
  for (let p = 0; p < parts; p++) starts[p + 1] += starts[p];
  const next = starts.slice(0, parts);
  const group: LineGroup = {
    starts,
    component: new Int32Array(chosen.length),
    source: new Int32Array(chosen.length),
  };
  for (const line of chosen) {
    const at = next[parent[line]]++;
    group.component[at] = component[line];
    group.source[at] = line;
  }
  return group;
}

/** Groups lines with a quantity and works out each one's ratio. */
export function groupQuantityLines(
  chosenLines: ChosenLines,
  lines: readonly PlanLine[],
  decimals: Uint8Array,
): QuantityLines {
  const group = groupLines(decimals.length, chosenLines);
  const num = new Float64Array(group.source.length);
  const den = new Float64Array(group.source.length);
  const wide = new Map<number, Ratio>();
  const known = new Map<string, Ratio>();
  for (let parent = 0; parent < decimals.length; parent++) {
    for (let at = group.starts[parent]; at < group.starts[parent + 1]; at++) {
      const line = lines[group.source[at]];
      const small = smallWhole(line, decimals[group.component[at]], decimals[parent]);
      if (small >= 0) {
        num[at] = small;
        den[at] = 1;
        continue;
      }
      storeRatio(
        { num, den, wide },
        at,
        ratioOf(line, decimals[group.component[at]], decimals[parent], known),
      );
    }
  }
  return { ...group, num, den, wide };
}

/** Keeps a ratio as exact numbers, or aside where they would not be exact. */
export function storeRatio(
  into: { num: Float64Array; den: Float64Array; wide: Map<number, Ratio> },
  at: number,
  ratio: Ratio,
): void {
  const exact = ratio.num <= Number.MAX_SAFE_INTEGER && ratio.den <= Number.MAX_SAFE_INTEGER;
  into.num[at] = exact ? Number(ratio.num) : Number.POSITIVE_INFINITY;
  into.den[at] = exact ? Number(ratio.den) : 1;
  if (!exact) into.wide.set(at, ratio);
}

/** Most lines take a few whole pieces without scrap: no need for a ratio. -1 where that is not so. */
function smallWhole(line: PlanLine, componentDecimals: number, parentDecimals: number): number {
  if (componentDecimals !== 0 || parentDecimals !== 0 || line.scrap !== "0") return -1;
  const text = line.quantity as string;
  if (text.length > 6) return -1;
  const value = +text;
  return Number.isInteger(value) && value >= 0 ? value : -1;
}

function ratioOf(line: PlanLine, component: number, parent: number, known: Map<string, Ratio>): Ratio {
  const name = `${line.quantity} ${line.scrap} ${component} ${parent}`;
  let ratio = known.get(name);
  if (!ratio) {
    ratio = lineRatio(line.quantity as string, line.scrap, component, parent);
    known.set(name, ratio);
  }
  return ratio;
}
