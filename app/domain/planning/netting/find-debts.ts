import type { Steps } from "../../quantity/steps";
import { leastSteps, subtractSteps } from "../../quantity/steps";

/** Whole steps of a part that demand `from` took though they were kept for demand `to`. */
export interface PartDebt {
  part: number;
  quantity: Steps;
  from: number;
  to: number;
}

type Taken = readonly ReadonlyMap<number, Steps>[];

/**
 * Compares what each demand takes from stock when parts are kept for earlier orders and when they are
 * released: what an earlier one loses to a later one is owed to it. Demands are indexes; sorted by the
 * demand owed to, then by part number of the structure.
 */
export function findDebts(kept: Taken, released: Taken): PartDebt[] {
  const debts: PartDebt[] = [];
  const more = released.map((own, demand) => excess(own, kept[demand]));
  for (let to = 0; to < kept.length; to++) {
    const lost = [...excess(kept[to], released[to])].sort((a, b) => a[0] - b[0]);
    for (const [part, quantity] of lost) {
      let owed: Steps = quantity;
      for (let from = to + 1; from < more.length && owed > 0; from++) {
        const extra = more[from].get(part) ?? 0;
        const paid = leastSteps(extra, owed);
        if (!(paid > 0)) continue;
        debts.push({ part, quantity: paid, from, to });
        more[from].set(part, subtractSteps(extra, paid));
        owed = subtractSteps(owed, paid);
      }
    }
  }
  return debts;
}

function excess(a: ReadonlyMap<number, Steps>, b: ReadonlyMap<number, Steps>): Map<number, Steps> {
  const over = new Map<number, Steps>();
  for (const [part, quantity] of a) {
    const rest = subtractSteps(quantity, b.get(part) ?? 0);
    if (rest > 0) over.set(part, rest);
  }
  return over;
}
