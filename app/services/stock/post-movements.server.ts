import type { Transaction } from "sequelize";
import { partKey } from "~/domain/planning/part-key";
import { parseDecimal } from "~/domain/quantity/parse-decimal";
import { checkMovement } from "~/domain/stock/check-movement";
import { formatStored } from "~/domain/stock/format-stored";
import type { BinSide, MovementRequest, PostedKind } from "~/domain/stock/types";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { fingerprintOf } from "~/services/idempotency/fingerprint-of";
import { runOnce } from "~/services/idempotency/run-once.server";
import { raiseRevision } from "~/services/revision/raise-revision.server";
import { AppError } from "~/utils/errors";
import { appendMovements, type RefusedDraft } from "./append-movements.server";
import { assertMayPost } from "./assert-may-post.server";
import { type LookedUpMovement, lookUpMovements, lotCodeOf } from "./look-up-movements.server";
import { refuseShortage } from "./refuse-shortage";
import type { StockActor } from "./stock-actor";

interface PostMovements {
  actor: StockActor;
  /** Made by the client before sending; the same key again gives the first answer back. */
  idempotencyKey: string;
  movements: readonly MovementRequest[];
  /** Joins this transaction; whoever began it retries and commits. */
  transaction?: Transaction;
  /** Most movements in one posting; an import posts a whole file. */
  most?: number;
}

/** A movement that was posted. Quantities have the part's decimals. */
export interface PostedMovement {
  id: number;
  kind: PostedKind;
  partNumber: string;
  quantity: string;
  lot: string;
  from: BinSide | null;
  to: BinSide | null;
  /** UTC, ISO 8601 with milliseconds. */
  happenedAt: string;
  reason: string;
  reference: string;
}

/** The answer to a posting. */
export interface Posted {
  movements: PostedMovement[];
  /** The stock revision that the posting raised. */
  revision: number;
}

const MOST_MOVEMENTS = 500;

/**
 * Posts movements, all or none, in the order given. With `reverseMovement` it is the only way into the ledger.
 * @throws AppError "bad-request" for a malformed key; "invalid" for movements that cannot be (each error names its
 * movement by `line`, from 1) and for a key used with other content; "forbidden"; "conflict" where there is not enough
 * on hand or the first request with the key still runs; "busy"
 */
export async function postMovements(posting: PostMovements): Promise<Posted> {
  const { actor, movements, most = MOST_MOVEMENTS } = posting;
  const now = new Date();
  assertPostable(movements, most, now);
  const fingerprint = fingerprintOf(["post", actor.personId, movements.map(canonical)]);
  return runOnce(
    { key: posting.idempotencyKey, fingerprint, actorId: actor.personId, transaction: posting.transaction },
    async (transaction, keyId) => {
      const kinds = movements.map((movement) => movement.kind);
      await assertMayPost(actor, kinds, transaction);
      const lookedUp = await lookUpMovements(movements, now, transaction);
      const drafts = lookedUp.map(({ draft }) => draft);
      const appended = await appendMovements({ keyId, personId: actor.personId, drafts }, transaction);
      if (!appended.ok) throw refuse(appended.refused, movements, lookedUp);
      const { ids } = appended;
      await appendAuditEvent(
        {
          actorId: actor.personId,
          act: "post-movements",
          subject: `movement ${ids[0]}`,
          after: {
            movements: ids.length,
            first: ids[0],
            last: ids[ids.length - 1],
            kinds: [...new Set(kinds)],
          },
        },
        transaction,
      );
      const revision = await raiseRevision("stock", transaction);
      return {
        movements: movements.map((movement, index) => present(ids[index], movement, lookedUp[index])),
        revision,
      };
    },
  );
}

function assertPostable(movements: readonly MovementRequest[], most: number, now: Date): void {
  if (movements.length === 0 || movements.length > most) {
    throw new AppError("invalid", `Send 1 to ${most} movements at a time; there are ${movements.length}.`);
  }
  const errors = movements.flatMap((movement, index) =>
    checkMovement(movement, now.getTime()).map((problem) => ({ line: index + 1, ...problem })),
  );
  if (errors.length > 0)
    throw new AppError("invalid", "Some movements cannot be posted; nothing was changed.", { errors });
}

/** What makes two movements the same content, however they are written. */
function canonical(movement: MovementRequest): unknown[] {
  const { kind, partNumber, quantity, from, to, happenedAt, reason, reference, expiresOn } = movement;
  const size = parseDecimal(quantity);
  const side = (place: BinSide | null | undefined) => (place ? [partKey(place.bin), place.state] : null);
  return [
    kind,
    partKey(partNumber),
    size ? `${size.digits}e-${size.scale}` : quantity,
    lotCodeOf(movement),
    side(from),
    side(to),
    happenedAt ? new Date(happenedAt).toISOString() : null,
    reason?.trim() ?? "",
    reference?.trim() ?? "",
    expiresOn ?? null,
  ];
}

function refuse(
  refused: readonly RefusedDraft[],
  movements: readonly MovementRequest[],
  lookedUp: readonly LookedUpMovement[],
): AppError {
  return refuseShortage(
    refused.map((each) => {
      const { part, lotCode } = lookedUp[each.draft];
      const { from, to } = movements[each.draft];
      const side = each.at.quantity < 0n ? from : to;
      return {
        refused: each,
        partNumber: part.partNumber,
        decimals: part.decimals,
        unit: part.unit,
        bin: side?.bin ?? "",
        lotCode,
      };
    }),
  );
}

function present(
  id: number,
  movement: MovementRequest,
  { draft, part, lotCode }: LookedUpMovement,
): PostedMovement {
  return {
    id,
    kind: movement.kind,
    partNumber: part.partNumber,
    quantity: formatStored(draft.legs[1].quantity, part.decimals),
    lot: lotCode,
    from: movement.from ?? null,
    to: movement.to ?? null,
    happenedAt: draft.happenedAt.toISOString(),
    reason: draft.reason,
    reference: draft.reference,
  };
}
