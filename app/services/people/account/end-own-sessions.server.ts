import { Op } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { Session } from "~/db/models/people/session";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import type { CurrentPerson } from "../current-person";
import { hashSecret } from "../secret.server";
import { ownId } from "./own-id";

/**
 * Ends one of one's own sessions, or with `others` all but the one that asks.
 * @param which the session's key, as `getAccount` gives it
 * @throws AppError `not-found` when it has ended already
 */
export async function endOwnSessions(
  which: { key: string } | "others",
  person: CurrentPerson,
  sessionId: string,
): Promise<void> {
  const personId = ownId(person);
  const known = which !== "others" && /^[0-9a-f]{16}$/.test(which.key) ? which.key : "none";
  const idHash = which === "others" ? { [Op.ne]: hashSecret(sessionId) } : { [Op.startsWith]: known };
  await inTransaction(async (transaction) => {
    const sessionsEnded = await Session.destroy({ where: { personId, idHash }, transaction });
    if (which !== "others" && sessionsEnded === 0)
      throw new AppError("not-found", "This session has ended already.");
    await appendAuditEvent(
      { actorId: personId, act: "own-account", subject: `person ${personId}`, after: { sessionsEnded } },
      transaction,
    );
  });
}
