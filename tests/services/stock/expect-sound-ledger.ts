import { expect } from "vitest";
import { checkInvariants } from "~/services/stock/check-invariants.server";

/** Every invariant of the ledger is asked; each count must be 0. */
export async function expectSoundLedger(): Promise<void> {
  const counts = await checkInvariants();
  expect(Object.entries(counts).filter(([, count]) => count !== 0)).toEqual([]);
}
