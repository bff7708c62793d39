import { divideUp } from "../../quantity/divide-up";
import type { QuantityLines, Ratio, Structure } from "../structure/structure";
import { PHANTOM } from "../structure/structure";
import type { Engine, PassInput, PassState } from "./pass-state";

/** The same netting in BigInt, for quantities past 2^53. A property test holds the two together. */
export const wideEngine: Engine = {
  zeros: (length) => new Array<bigint>(length).fill(0n),
  from: (value) => BigInt(value),
  copy: (amounts) => (amounts as bigint[]).slice(),
  subtract: (from, less) => Array.from(less as bigint[], (used, p) => BigInt(from[p]) - used),
  grown: (mask, after, before) => {
    const parts: number[] = [];
    for (let p = 0; p < mask.length; p++) if (after[p] > before[p] && mask[p] === 1) parts.push(p);
    return parts;
  },
  run: runWidePass,
};

interface WideState extends PassState {
  gross: bigint[];
  fromStock: bigint[];
  onOrder: bigint[];
  net: bigint[];
  start: bigint[];
  throughLine: bigint[];
}

function runWidePass(structure: Structure, input: PassInput, state: PassState): boolean {
  const out = state as WideState;
  const base = input.base as WideState;
  const { fixed, open } = structure;
  out.gross.fill(0n);
  for (let k = 0; k < base.throughLine.length; k++) out.throughLine[k] = base.throughLine[k];
  for (const [part, quantity] of base.asked) out.gross[part] = BigInt(quantity);
  out.gross[input.part] += BigInt(input.quantity);
  out.asked = new Map(base.asked).set(input.part, out.gross[input.part]);
  for (let p = 0; p < out.gross.length; p++) {
    netPart(structure, input, base, out, p);
    const begin = out.start[p];
    if (begin === 0n) continue;
    for (let k = fixed.starts[p]; k < fixed.starts[p + 1]; k++) {
      out.gross[fixed.component[k]] += timesRatio(begin, ratioAt(fixed, k));
    }
    if (open[p] === 1) addConditional(structure, input, base, out, p);
  }
  return true;
}

function netPart(structure: Structure, input: PassInput, base: WideState, out: WideState, p: number): void {
  const added = out.gross[p] - base.gross[p];
  const taken = least(added, BigInt(input.stock[p]));
  const ordered = input.supply === null ? 0n : least(added - taken, BigInt(input.supply[p]));
  out.fromStock[p] = base.fromStock[p] + taken;
  out.onOrder[p] = base.onOrder[p] + ordered;
  out.net[p] = base.net[p] + added - taken - ordered;
  if (structure.leaf[p] === 1) out.start[p] = 0n;
  else if (structure.sourcing[p] === PHANTOM) out.start[p] = out.net[p];
  else out.start[p] = timesRatio(out.net[p], yieldAt(structure, p));
}

function addConditional(
  structure: Structure,
  input: PassInput,
  base: WideState,
  out: WideState,
  part: number,
): void {
  const lines = structure.conditional;
  const added = out.start[part] - base.start[part];
  for (let k = lines.starts[part]; k < lines.starts[part + 1]; k++) {
    out.throughLine[k] = base.throughLine[k] + (input.active[k] === 1 ? added : 0n);
    out.gross[lines.component[k]] += timesRatio(out.throughLine[k], ratioAt(lines, k));
  }
}

function least(a: bigint, b: bigint): bigint {
  return a < b ? a : b;
}

function timesRatio(quantity: bigint, ratio: Ratio): bigint {
  return divideUp(quantity * ratio.num, ratio.den);
}

function ratioAt(lines: QuantityLines, at: number): Ratio {
  return lines.wide.get(at) ?? { num: BigInt(lines.num[at]), den: BigInt(lines.den[at]) };
}

function yieldAt(structure: Structure, p: number): Ratio {
  return (
    structure.wideYield.get(p) ?? { num: BigInt(structure.yieldNum[p]), den: BigInt(structure.yieldDen[p]) }
  );
}
