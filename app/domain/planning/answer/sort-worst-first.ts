import { requireDecimal } from "../../quantity/parse-decimal";
import type { Steps } from "../../quantity/steps";
import type { Structure } from "../structure/structure";

interface Lacking {
  part: number;
  /** Day number. */
  readyOn: number;
  short: Steps;
}

/** Latest day first, then the dearest, then by part number (PLANNING.md, section 4). A new array. */
export function sortWorstFirst<Stopper extends Lacking>(
  structure: Structure,
  stoppers: readonly Stopper[],
): Stopper[] {
  const keyed = stoppers.map((stopper) => ({ stopper, cost: exactCost(structure, stopper) }));
  keyed.sort((a, b) => {
    if (a.stopper.readyOn !== b.stopper.readyOn) return b.stopper.readyOn - a.stopper.readyOn;
    if (a.cost !== b.cost) return a.cost < b.cost ? 1 : -1;
    const [left, right] = [structure.parts[a.stopper.part], structure.parts[b.stopper.part]];
    return left.partNumber < right.partNumber ? -1 : 1;
  });
  return keyed.map(({ stopper }) => stopper);
}

const FINEST = 24;

/** Short x unit cost in whole 10^-24, to compare without rounding. */
function exactCost(structure: Structure, { part, short }: Lacking): bigint {
  const cost = requireDecimal(structure.parts[part].unitCost ?? "0");
  const scale = BigInt(FINEST - cost.scale - structure.decimals[part]);
  return BigInt(short) * cost.digits * 10n ** scale;
}
