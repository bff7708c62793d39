import { ladderRuns } from "~/domain/planning/ladder-runs";
import type { Rung } from "~/domain/planning/types";

type Stopper = Rung["stoppers"][number];

/** A row of the drawn ladder: one kit, or a run of kits that stand or fall together. */
export interface LadderRow {
  from: number;
  to: number;
  ready: boolean;
  /** Of kit `to`. */
  cost: string | null;
  readyOn: string;
  /** Parts that stop no kit below this row. */
  fresh: Stopper[];
  /** Parts that stop kits below it already. */
  carried: Stopper[];
}

/** The ladder from the floor up, the stoppers of each row in the order given. */
export function ladderRows(ladder: Rung[], order: string[]): LadderRow[] {
  const place = new Map(order.map((partNumber, index) => [partNumber, index]));
  const known = new Set<string>();
  return ladderRuns(ladder).map(({ from, top }) => {
    const sorted = top.stoppers.toSorted(
      (a, b) => (place.get(a.partNumber) ?? order.length) - (place.get(b.partNumber) ?? order.length),
    );
    const fresh = sorted.filter((stopper) => !known.has(stopper.partNumber));
    const carried = sorted.filter((stopper) => known.has(stopper.partNumber));
    for (const stopper of fresh) known.add(stopper.partNumber);
    const ready = top.stoppers.length === 0;
    return { from, to: top.kits, ready, cost: top.cost, readyOn: top.readyOn, fresh, carried };
  });
}
