import { Op } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { Session } from "~/db/models/people/session";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";

/**
 * Ends one session of a person.
 * @param sessionKey what `getPersonPage` calls it: the beginning of its hash
 * @throws AppError `not-found` when it has ended already, `forbidden`
 */
export async function endTheirSession(
  personId: number,
  sessionKey: string,
  actor: CurrentPerson,
): Promise<void> {
  assertMay(actor, "people");
  await inTransaction(async (transaction) => {
    const idHash = { [Op.startsWith]: /^[0-9a-f]{16}$/.test(sessionKey) ? sessionKey : "none" };
    const ended = await Session.destroy({ where: { personId, idHash }, transaction });
    if (ended === 0) throw new AppError("not-found", "This session has ended already.");
    const after = { sessionsEnded: ended };
    await appendAuditEvent(
      { actorId: actor.id, act: "people", subject: `person ${personId}`, after },
      transaction,
    );
  });
}
