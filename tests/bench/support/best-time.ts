/** Milliseconds of the fastest of so many runs: what is left when others leave the machine alone. */
export function bestTime(runs: number, work: () => unknown): number {
  let best = Number.POSITIVE_INFINITY;
  for (let run = 0; run < runs; run++) {
    const begin = performance.now();
    work();
    best = Math.min(best, performance.now() - begin);
  }
  return best;
}

/** Milliseconds of the fastest of so many runs, waited for one after another. */
export async function bestTimeOf(runs: number, work: () => Promise<unknown>): Promise<number> {
  let best = Number.POSITIVE_INFINITY;
  for (let run = 0; run < runs; run++) {
    const begin = performance.now();
    await work();
    best = Math.min(best, performance.now() - begin);
  }
  return best;
}

/** Milliseconds of one of `many` in the fastest of so many runs, for work too short to be timed alone. */
export function bestTimeEach(runs: number, many: number, work: (run: number) => unknown): number {
  const time = bestTime(runs, () => {
    for (let run = 0; run < many; run++) work(run);
  });
  return time / many;
}
