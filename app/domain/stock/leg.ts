import type { BalanceState, Place } from "./types";

/** One side of a movement, with everything looked up. */
export interface Leg {
  partId: number;
  lotId: number;
  binId: number | null;
  place: Place;
  state: BalanceState | null;
  /** Whole millionths: into the place with a plus, out of it with a minus. */
  quantity: bigint;
}

/** A leg in a bin: one that changes a balance. */
export interface BinLeg extends Leg {
  binId: number;
  state: BalanceState;
}

export function isBinLeg(leg: Leg): leg is BinLeg {
  return leg.binId !== null && leg.state !== null;
}
