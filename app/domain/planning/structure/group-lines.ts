import type { EdgesByParent } from "../../graph/group-edges";
import type { PlanLine } from "../types";
import { lineRatio } from "./line-ratio";
import type { ReadLines } from "./read-lines";
import { AS_REQUIRED, CONDITIONAL, FIXED } from "./read-lines";
import type { LineGroup, QuantityLines, Ratio, Structure } from "./structure";

/** Lines as they were read, by their parents' places in the input, and the parts' new order. */
interface LinesToGroup {
  read: ReadLines;
  byParent: EdgesByParent;
  /** Old place by new number, and the other way round. */
  order: Int32Array;
  numbers: Int32Array;
  decimals: Uint8Array;
  lines: readonly PlanLine[];
}

/** Lines by kind and parent number, with each one's ratio; within a parent they keep the order of the input. */
export function groupByKind(input: LinesToGroup): Pick<Structure, "fixed" | "conditional" | "asRequired"> {
  const counts = [0, 0, 0, 0];
  const { kind } = input.read;
  for (let line = 0; line < kind.length; line++) counts[kind[line]]++;
  return {
    fixed: addRatios(input, groupLines(input, FIXED, counts[FIXED])),
    conditional: addRatios(input, groupLines(input, CONDITIONAL, counts[CONDITIONAL])),
    asRequired: groupLines(input, AS_REQUIRED, counts[AS_REQUIRED] + counts[AS_REQUIRED | CONDITIONAL]),
  };
}

function groupLines(
  { read, byParent, order, numbers }: LinesToGroup,
  wanted: number,
  count: number,
): LineGroup {
  const starts = new Int32Array(order.length + 1);
  const component = new Int32Array(count);
  const source = new Int32Array(count);
  if (count === 0) return { starts, component, source };
  let at = 0;
  for (let p = 0; p < order.length; p++) {
    starts[p] = at;
    const end = byParent.starts[order[p] + 1];
    for (let k = byParent.starts[order[p]]; k < end; k++) {
      const line = byParent.edges[k];
      const kind = read.kind[line];
      if (kind !== wanted && (kind & AS_REQUIRED & wanted) === 0) continue;
      component[at] = numbers[read.component[line]];
      source[at++] = line;
    }
  }
  starts[order.length] = at;
  return { starts, component, source };
}

function addRatios({ read, lines, numbers, decimals }: LinesToGroup, group: LineGroup): QuantityLines {
  const { source, component } = group;
  const num = new Float64Array(source.length);
  const den = new Float64Array(source.length).fill(1);
  const wide = new Map<number, Ratio>();
  const known = new Map<string, Ratio>();
  for (let at = 0; at < source.length; at++) {
    const line = source[at];
    num[at] = read.pieces[line];
    if (num[at] >= 0) continue;
    const parent = numbers[read.parent[line]];
    storeRatio(
      { num, den, wide },
      at,
      ratioOf(lines[line], decimals[component[at]], decimals[parent], known),
    );
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

function ratioOf(line: PlanLine, component: number, parent: number, known: Map<string, Ratio>): Ratio {
  const name = `${line.quantity} ${line.scrap} ${component} ${parent}`;
  let ratio = known.get(name);
  if (!ratio) {
    ratio = lineRatio(line.quantity as string, line.scrap, component, parent);
    known.set(name, ratio);
  }
  return ratio;
}
