import type { Rung } from "~/domain/planning/types";

const MOST_DRAWN = 12;

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

/**
 * The ladder from the floor up. Up to twelve kits have a row each; longer ladders have a row for each run of
 * kits with the same stoppers, and the last of at most twelve rows takes all that is above.
 */
export function ladderRows(ladder: Rung[], order: string[]): LadderRow[] {
  const place = new Map(order.map((partNumber, index) => [partNumber, index]));
  const known = new Set<string>();
  return tops(ladder).map(({ from, rung }) => {
    const sorted = rung.stoppers.toSorted(
      (a, b) => (place.get(a.partNumber) ?? order.length) - (place.get(b.partNumber) ?? order.length),
    );
    const fresh = sorted.filter((stopper) => !known.has(stopper.partNumber));
    const carried = sorted.filter((stopper) => known.has(stopper.partNumber));
    for (const stopper of fresh) known.add(stopper.partNumber);
    const ready = rung.stoppers.length === 0;
    return { from, to: rung.kits, ready, cost: rung.cost, readyOn: rung.readyOn, fresh, carried };
  });
}

/** The highest rung of each row with the first kit of the row. */
function tops(ladder: Rung[]): { from: number; rung: Rung }[] {
  if (ladder.length <= MOST_DRAWN) return ladder.map((rung) => ({ from: rung.kits, rung }));
  const runs: { from: number; rung: Rung }[] = [];
  for (const rung of ladder) {
    const open = runs.at(-1);
    const joins = open !== undefined && (sameStoppers(open.rung, rung) || runs.length === MOST_DRAWN);
    if (joins) open.rung = rung;
    else runs.push({ from: rung.kits, rung });
  }
  return runs;
}

/** A part that stops a kit stops every kit above it, so two rungs differ exactly when their counts do. */
function sameStoppers(a: Rung, b: Rung): boolean {
  return a.stoppers.length === b.stoppers.length;
}
