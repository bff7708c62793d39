import type { Rung } from "./types";

/** More rungs than this are drawn as runs of kits that stand or fall together. */
const MOST_DRAWN = 12;

/** Kits that stand or fall together; `top` is the rung of the highest of them. */
export interface LadderRun {
  from: number;
  top: Rung;
}

/**
 * The ladder from the floor up in rows to draw. Up to twelve kits have one each; a longer ladder has one for each
 * run of kits with the same stoppers, and the last of at most twelve takes all that is above. A ladder from which
 * `keepDrawnRungs` has taken rungs gives the same runs.
 */
export function ladderRuns(ladder: readonly Rung[]): LadderRun[] {
  const isLong = (ladder.at(-1)?.kits ?? 0) > MOST_DRAWN;
  const runs: LadderRun[] = [];
  for (const rung of ladder) {
    const open = runs.at(-1);
    const joins =
      isLong && open !== undefined && (sameStoppers(open.top, rung) || runs.length === MOST_DRAWN);
    if (joins) open.top = rung;
    else runs.push({ from: (open?.top.kits ?? 0) + 1, top: rung });
  }
  return runs;
}

/** A part that stops a kit stops every kit above it, so two rungs have the same stoppers when they have as many. */
function sameStoppers(a: Rung, b: Rung): boolean {
  return a.stoppers.length === b.stoppers.length;
}

/**
 * The rungs that a page needs of a ladder: the top of each run and the first that cannot be climbed. A thousand
 * rungs with all their stoppers are tens of megabytes.
 */
export function keepDrawnRungs(ladder: readonly Rung[]): Rung[] {
  const kept = new Set(ladderRuns(ladder).map((run) => run.top));
  const stopped = ladder.find((rung) => rung.stoppers.length > 0);
  if (stopped !== undefined) kept.add(stopped);
  return ladder.filter((rung) => kept.has(rung));
}
