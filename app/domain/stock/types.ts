import type { DecimalString, IsoDate } from "~/domain/planning/types";

/** What may be done with stock that lies in a bin. */
export type BalanceState = "usable" | "held" | "staged" | "with-supplier";

/** Where stock is: in a bin, or in a virtual place outside of the bins, so that every movement sums to zero. */
export type Place = "bin" | "supplier" | "customer" | "scrap" | "adjustment" | "in-work";

/** The movements that people post. */
export type PostedKind = "receive" | "return" | "issue" | "scrap" | "move" | "hold" | "release" | "adjust";

export type MovementKind = PostedKind | "reverse";

/** One side of a movement in a bin. */
export interface BinSide {
  bin: string;
  state: BalanceState;
}

/** A movement as it is asked for, before part, lot and bins are looked up. */
export interface MovementRequest {
  kind: PostedKind;
  partNumber: string;
  /** Above 0, in the part's unit. */
  quantity: DecimalString;
  /** Left out, null or "": stock without a lot. */
  lot?: string | null;
  from?: BinSide | null;
  to?: BinSide | null;
  /** ISO 8601 moment; left out or null: now. */
  happenedAt?: string | null;
  reason?: string | null;
  reference?: string | null;
  /** Expiry date of the lot, kept where it is given. */
  expiresOn?: IsoDate | null;
}
