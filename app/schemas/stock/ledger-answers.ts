import type { BalanceState, BinSide, MovementKind } from "~/domain/stock/types";
import type { Standing } from "~/schemas/parts/part-answer";

/** A movement as the ledger holds it. Quantities have the part's decimals. */
export interface LedgerMovement {
  id: number;
  kind: MovementKind;
  partNumber: string;
  unit: string;
  quantity: string;
  /** "" is stock without a lot. */
  lot: string;
  /** Null outside of the bins. */
  from: BinSide | null;
  to: BinSide | null;
  /** Moments in UTC, ISO 8601 with milliseconds. */
  happenedAt: string;
  enteredAt: string;
  /** Who entered it; null for a program. */
  person: string | null;
  reason: string;
  reference: string;
  reverses: number | null;
  reversedBy: number | null;
}

export interface MovementsPage {
  movements: LedgerMovement[];
  /** The cursor of the next page, null on the last. */
  next: string | null;
}

export interface StockBalance {
  partNumber: string;
  unit: string;
  bin: string;
  lot: string | null;
  state: BalanceState;
  quantity: string;
  expiresOn: string | null;
  /** `state`, but `expired` where the lot is past its day. */
  standing: Standing;
}

export interface StockAnswer {
  balances: StockBalance[];
}
