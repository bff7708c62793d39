import type { PlanLine } from "../types";
import { lineRatio } from "./line-ratio";
import type { ReadLines } from "./read-lines";
import { AS_REQUIRED, CONDITIONAL } from "./read-lines";
import type { LineGroup, QuantityLines, Ratio, Structure } from "./structure";

type Groups = Pick<Structure, "fixed" | "conditional" | "asRequired">;

/** Lines by kind and parent number, with each one's ratio; within a parent they keep the order of the input. */
export function groupByKind(read: ReadLines, lines: readonly PlanLine[], decimals: Uint8Array): Groups {
  const parts = decimals.length;
  const groupOf = (isOfKind: (kind: number) => boolean) =>
    groupLines(parts, read, choose(read.kind, isOfKind));
  const ratios = (group: LineGroup) => addRatios(group, read, lines, decimals);
  return {
    fixed: ratios(groupOf((kind) => kind === 0)),
    conditional: ratios(groupOf((kind) => kind === CONDITIONAL)),
    asRequired: groupOf((kind) => (kind & AS_REQUIRED) !== 0),
  };
}

function choose(kind: Uint8Array, isOfKind: (kind: number) => boolean): Int32Array {
  const isChosen = Uint8Array.of(0, 1, 2, 3).map((one) => (isOfKind(one) ? 1 : 0));
  let count = 0;
  for (let line = 0; line < kind.length; line++) count += isChosen[kind[line]];
  const chosen = new Int32Array(count);
  let filled = 0;
  for (let line = 0; line < kind.length; line++) if (isChosen[kind[line]] === 1) chosen[filled++] = line;
  return chosen;
}

function groupLines(parts: number, { parent, component }: ReadLines, chosen: Int32Array): LineGroup {
  const starts = new Int32Array(parts + 1);
  for (let k = 0; k < chosen.length; k++) starts[parent[chosen[k]] + 1]++;
  for (let p = 0; p < parts; p++) starts[p + 1] += starts[p];
  const next = starts.slice(0, parts);
  const group = {
    starts,
    component: new Int32Array(chosen.length),
    source: new Int32Array(chosen.length),
  };
  for (let k = 0; k < chosen.length; k++) {
    const line = chosen[k];
    const at = next[parent[line]]++;
    group.component[at] = component[line];
    group.source[at] = line;
  }
  return group;
}

function addRatios(
  group: LineGroup,
  { parent, pieces }: ReadLines,
  lines: readonly PlanLine[],
  decimals: Uint8Array,
): QuantityLines {
  const { source, component } = group;
  const num = new Float64Array(source.length);
  const den = new Float64Array(source.length).fill(1);
  const wide = new Map<number, Ratio>();
  const known = new Map<string, Ratio>();
  for (let at = 0; at < source.length; at++) {
    const line = source[at];
    num[at] = pieces[line];
    if (pieces[line] >= 0) continue;
    const ratio = ratioOf(lines[line], decimals[component[at]], decimals[parent[line]], known);
    storeRatio({ num, den, wide }, at, ratio);
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
