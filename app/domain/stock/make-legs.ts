import { KIND_RULES } from "./kind-rules";
import type { Leg } from "./leg";
import type { BalanceState, PostedKind } from "./types";

interface Side {
  binId: number;
  state: BalanceState;
}

interface Movement {
  kind: PostedKind;
  partId: number;
  lotId: number;
  /** Whole millionths, above 0. */
  quantity: bigint;
  from: Side | null;
  to: Side | null;
}

/** The two legs of a movement that `checkMovement` found right; they sum to zero. */
export function makeLegs(movement: Movement): [Leg, Leg] {
  const { partId, lotId, quantity } = movement;
  const legAt = (side: Side | null, signed: bigint): Leg => ({
    partId,
    lotId,
    binId: side?.binId ?? null,
    place: side ? "bin" : outsideOf(movement.kind),
    state: side?.state ?? null,
    quantity: signed,
  });
  return [legAt(movement.from, -quantity), legAt(movement.to, quantity)];
}

function outsideOf(kind: PostedKind) {
  const { outside } = KIND_RULES[kind];
  if (outside === null) throw new Error(`A movement of kind ${kind} has two bins.`);
  return outside;
}
