import { inTransaction } from "~/db/in-transaction.server";
import { ApiToken } from "~/db/models/people/api-token";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import type { CurrentPerson } from "../current-person";
import { ownId } from "./own-id";

/**
 * Makes one of one's own tokens worthless for good.
 * @throws AppError `not-found` when it is none of theirs or has ended already
 */
export async function withdrawOwnToken(tokenId: number, person: CurrentPerson): Promise<void> {
  const personId = ownId(person);
  await inTransaction(async (transaction) => {
    const where = { id: tokenId, personId, revokedAt: null };
    const token = await ApiToken.findOne({ where, transaction, lock: true });
    if (!token) throw new AppError("not-found", "This token has ended already.");
    await token.update({ revokedAt: new Date() }, { transaction });
    const after = { tokenEnded: token.name };
    await appendAuditEvent(
      { actorId: personId, act: "own-account", subject: `person ${personId}`, after },
      transaction,
    );
  });
}
