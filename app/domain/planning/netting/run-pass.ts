import type { Structure } from "../structure/structure";
import type { Engine, PassInput, PassState } from "./pass-state";

const MOST = Number.MAX_SAFE_INTEGER;
/** Below it a product and one divisor more are still exact. */
const HALF = 2 ** 52;

/** Netting in doubles, exact below 2^53 (PLANNING.md, section 3). */
export const numberEngine: Engine = {
  zeros: (length) => new Float64Array(length),
  from: (value) => Number(value),
  copy: (amounts) => (amounts as Float64Array).slice(),
  subtract: (from, less) => subtract(from as Float64Array, less as Float64Array),
  grown: (mask, after, before) => grown(mask, after as Float64Array, before as Float64Array),
  run: runPass,
};

function subtract(from: Float64Array, less: Float64Array): Float64Array {
  const rest = new Float64Array(from.length);
  for (let p = 0; p < rest.length; p++) rest[p] = from[p] - less[p];
  return rest;
}

function grown(mask: Uint8Array, after: Float64Array, before: Float64Array): number[] {
  const parts: number[] = [];
  for (let p = 0; p < mask.length; p++) if (after[p] > before[p] && mask[p] === 1) parts.push(p);
  return parts;
}

interface NumberState extends PassState {
  gross: Float64Array;
  fromStock: Float64Array;
  onOrder: Float64Array;
  net: Float64Array;
  start: Float64Array;
  throughLine: Float64Array;
}

/**
 * One pass: parents before components, each part once, each line once. Requirements are worked out from
 * the whole parent quantity so far, so rounding up happens once a line however the kits are asked for.
 */
function runPass(structure: Structure, input: PassInput, state: PassState): boolean {
  const out = state as NumberState;
  const base = input.base as NumberState;
  const { leaf, yieldNum, yieldDen, open } = structure;
  const { starts, component, num, den } = structure.fixed;
  const { gross, fromStock, onOrder, net, start } = out;
  const { gross: hadGross, fromStock: hadStock, onOrder: hadOrders, net: hadNet } = base;
  const stock = input.stock as Float64Array;
  const supply = input.supply as Float64Array | null;
  for (const amounts of [gross, fromStock, onOrder, net, start]) amounts.fill(0);
  out.throughLine.set(base.throughLine);
  for (const [part, quantity] of base.asked) gross[part] = quantity as number;
  gross[input.part] += Number(input.quantity);
  out.asked = new Map(base.asked).set(input.part, gross[input.part]);
  const hasConditions = structure.conditional.component.length > 0;
  for (let p = 0; p < gross.length; p++) {
    const need = gross[p];
    if (need === 0) continue;
    if (need > MOST) return false;
    const added = need - hadGross[p];
    const taken = Math.min(added, stock[p]);
    let left = added - taken;
    fromStock[p] = hadStock[p] + taken;
    if (supply !== null) {
      const ordered = Math.min(left, supply[p]);
      onOrder[p] = hadOrders[p] + ordered;
      left -= ordered;
    }
    const rest = hadNet[p] + left;
    net[p] = rest;
    if (leaf[p] === 1 || rest === 0) continue;
    // A phantom passes on what it is asked for: its yield is 1.
    const begin = yieldDen[p] === 1 ? rest * yieldNum[p] : timesRatio(rest, yieldNum[p], yieldDen[p]);
    if (begin > MOST) return false;
    start[p] = begin;
    for (let k = starts[p], end = starts[p + 1]; k < end; k++) {
      gross[component[k]] += den[k] === 1 ? begin * num[k] : timesRatio(begin, num[k], den[k]);
    }
    if (hasConditions && open[p] === 1) addConditional(structure, input, base, out, p);
  }
  return true;
}

/** ceil(quantity x num / den); infinity where doubles cannot say it. */
function timesRatio(quantity: number, num: number, den: number): number {
  const product = quantity * num;
  if (product < HALF && den < HALF) {
    // Division may round up to the next whole number, and only there the rest is below 0. Far faster than `%`.
    const whole = Math.floor(product / den);
    const rest = product - whole * den;
    return rest > 0 ? whole + 1 : whole;
  }
  if (product <= MOST) {
    const rest = product % den;
    return (product - rest) / den + (rest > 0 ? 1 : 0);
  }
  if (num === Number.POSITIVE_INFINITY) return num;
  const wide = (BigInt(quantity) * BigInt(num) + BigInt(den) - 1n) / BigInt(den);
  return wide > MOST ? Number.POSITIVE_INFINITY : Number(wide);
}

/** Conditional lines see only the parents of kits for which they count. */
function addConditional(
  structure: Structure,
  input: PassInput,
  base: NumberState,
  out: NumberState,
  part: number,
): void {
  const { starts, component, num, den } = structure.conditional;
  const added = out.start[part] - base.start[part];
  for (let k = starts[part]; k < starts[part + 1]; k++) {
    const through = base.throughLine[k] + (input.active[k] === 1 ? added : 0);
    out.throughLine[k] = through;
    out.gross[component[k]] += timesRatio(through, num[k], den[k]);
  }
}
