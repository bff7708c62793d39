import { inTransaction } from "~/db/in-transaction.server";
import { ApiToken } from "~/db/models/people/api-token";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";

/**
 * Makes one token of a person (or of no person: one that stands for a role) worthless for good.
 * @throws AppError `not-found` when it is none of theirs or has ended already, `forbidden`
 */
export async function endTheirToken(
  personId: number | null,
  tokenId: number,
  actor: CurrentPerson,
): Promise<void> {
  assertMay(actor, "people");
  await inTransaction(async (transaction) => {
    const where = { id: tokenId, personId, revokedAt: null };
    const token = await ApiToken.findOne({ where, transaction, lock: true });
    if (!token) throw new AppError("not-found", "This token has ended already.");
    await token.update({ revokedAt: new Date() }, { transaction });
    const subject = personId === null ? `token ${tokenId}` : `person ${personId}`;
    const after = { tokenEnded: token.name };
    await appendAuditEvent({ actorId: actor.id, act: "people", subject, after }, transaction);
  });
}
