import type { BinLeg } from "./leg";

/** What identifies a balance. */
export type BalancePlace = Pick<BinLeg, "partId" | "binId" | "lotId" | "state">;

export function balanceKey({ partId, binId, lotId, state }: BalancePlace): string {
  return `${partId}/${binId}/${lotId}/${state}`;
}

/** The one order in which balances are locked: part, bin, lot, state. */
export function compareBalances(a: BalancePlace, b: BalancePlace): number {
  return (
    a.partId - b.partId ||
    a.binId - b.binId ||
    a.lotId - b.lotId ||
    (a.state < b.state ? -1 : a.state > b.state ? 1 : 0)
  );
}
