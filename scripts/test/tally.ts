/** What a runner found. */
export interface Tally {
  passed: number;
  failed: number;
  skipped: number;
}

/** A runner that ended badly without naming a failed test counts as one. */
export function withCrash(tally: Tally | undefined, code: number): Tally {
  if (!tally) return { passed: 0, failed: 1, skipped: 0 };
  return code !== 0 && tally.failed === 0 ? { ...tally, failed: 1 } : tally;
}
