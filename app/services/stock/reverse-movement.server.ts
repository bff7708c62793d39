import { randomUUID } from "node:crypto";
import { type Transaction, UniqueConstraintError } from "sequelize";
import type { Leg } from "~/domain/stock/leg";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { fingerprintOf } from "~/services/idempotency/fingerprint-of";
import { runOnce } from "~/services/idempotency/run-once.server";
import { raiseRevision } from "~/services/revision/raise-revision.server";
import { AppError } from "~/utils/errors";
import { appendMovements } from "./append-movements.server";
import { assertMayReverse } from "./assert-may-reverse.server";
import { findLegs } from "./find-legs.server";
import { findMovement } from "./find-movement.server";
import { refuseShortage } from "./refuse-shortage";
import type { StockActor } from "./stock-actor";

interface ReverseMovement {
  actor: StockActor;
  movementId: number;
  reason: string;
  /** Left out: the movement itself is what can be reversed only once. */
  idempotencyKey?: string;
  transaction?: Transaction;
}

export interface Reversed {
  /** The new movement. */
  id: number;
  reverses: number;
  revision: number;
}

/**
 * Takes a movement back by a new one with the opposite legs, dated as the first: what never happened has not
 * happened at any time.
 * @throws AppError "not-found"; "forbidden" unless it is one's own of the same day or one is the manager; "invalid"
 * without a reason; "conflict" where it is reversed already, is a reversal itself, or the stock has gone on
 */
export async function reverseMovement(reversal: ReverseMovement): Promise<Reversed> {
  const { actor, movementId, idempotencyKey = randomUUID(), transaction } = reversal;
  const reason = reversal.reason.trim();
  if (reason === "" || reason.length > 500) {
    const message = "Give the reason of the reversal, in at most 500 characters.";
    throw new AppError("invalid", message, { errors: [{ field: "reason", message }] });
  }
  const fingerprint = fingerprintOf(["reverse", actor.personId, movementId, reason]);
  try {
    return await runOnce(
      { key: idempotencyKey, fingerprint, actorId: actor.personId, transaction },
      (inside, keyId) => appendReversal({ actor, movementId, reason, keyId }, inside),
    );
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw reversedAlready(movementId);
    throw error;
  }
}

async function appendReversal(
  reversal: { actor: StockActor; movementId: number; reason: string; keyId: number },
  transaction: Transaction,
): Promise<Reversed> {
  const { actor, movementId, reason, keyId } = reversal;
  const movement = await findMovement(movementId, transaction);
  if (!movement) throw new AppError("not-found", `There is no movement ${movementId}.`);
  await assertMayReverse(actor, movement, transaction);
  if (movement.reversedBy !== null) throw reversedAlready(movementId);
  if (movement.kind === "reverse") {
    throw new AppError(
      "conflict",
      `Movement ${movementId} is a reversal itself; post the movement anew instead.`,
    );
  }
  const { happenedAt, reference } = movement;
  const found = await findLegs(movementId, transaction);
  const legs = found.map(({ leg }): Leg => ({ ...leg, quantity: -leg.quantity }));
  const draft = { kind: "reverse" as const, happenedAt, reason, reference, reverses: movementId, legs };
  const appended = await appendMovements({ keyId, personId: actor.personId, drafts: [draft] }, transaction);
  if (!appended.ok) {
    throw refuseShortage(
      appended.refused.map((refused) => ({ ...found[legs.indexOf(refused.at)], refused })),
    );
  }
  const [id] = appended.ids;
  const audit = { actorId: actor.personId, act: "reverse-movement", subject: `movement ${movementId}` };
  await appendAuditEvent({ ...audit, after: { reversedBy: id, reason } }, transaction);
  return { id, reverses: movementId, revision: await raiseRevision("stock", transaction) };
}

function reversedAlready(movementId: number): AppError {
  return new AppError("conflict", `Movement ${movementId} is reversed already; a movement is reversed once.`);
}
