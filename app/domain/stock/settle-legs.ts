import { balanceKey } from "./balance-key";
import type { BinLeg } from "./leg";
import { STORED_LIMIT } from "./stored-decimals";

/** A balance before the legs. */
interface Balance {
  quantity: bigint;
  sequence: number;
}

/** A leg that cannot be posted, with what the balance held when its turn came. */
export interface RefusedLeg {
  /** Index into the legs given. */
  leg: number;
  code: "not-enough" | "too-much";
  onHand: bigint;
}

export interface BalanceChange {
  change: bigint;
  legs: number;
}

export type SettledLegs =
  | { ok: true; sequences: number[]; changes: Map<string, BalanceChange> }
  | { ok: false; refused: RefusedLeg[] };

/**
 * Applies legs to their balances one after the other: none may make its balance negative, not even until a later
 * one fills it up again.
 * @param balances by `balanceKey`; every leg has one
 * @returns the number of each leg within its balance, and the change of each balance
 */
export function settleLegs(legs: readonly BinLeg[], balances: ReadonlyMap<string, Balance>): SettledLegs {
  const changes = new Map<string, BalanceChange>();
  const sequences: number[] = [];
  const refused: RefusedLeg[] = [];
  for (const [index, leg] of legs.entries()) {
    const key = balanceKey(leg);
    const before = balances.get(key);
    if (!before) throw new Error(`No balance ${key} was read.`);
    const soFar = changes.get(key) ?? { change: 0n, legs: 0 };
    const onHand = before.quantity + soFar.change;
    const after = onHand + leg.quantity;
    if (after < 0n || after >= STORED_LIMIT) {
      refused.push({ leg: index, code: after < 0n ? "not-enough" : "too-much", onHand });
      continue;
    }
    const settled = { change: soFar.change + leg.quantity, legs: soFar.legs + 1 };
    changes.set(key, settled);
    sequences.push(before.sequence + settled.legs);
  }
  return refused.length > 0 ? { ok: false, refused } : { ok: true, sequences, changes };
}
