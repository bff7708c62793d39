import { inTransaction } from "~/db/in-transaction.server";
import { Session } from "~/db/models/people/session";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";
import { lockPerson } from "../manage/lock-person.server";
import { removeSecondFactor } from "./remove-second-factor.server";

/**
 * Takes away the second factor of somebody who has lost it, and ends their sessions.
 * @throws AppError `not-found`, `forbidden`, `conflict` for one's own or where none is on
 */
export async function resetSecondFactor(personId: number, actor: CurrentPerson): Promise<void> {
  assertMay(actor, "people");
  if (actor.id === personId)
    throw new AppError("conflict", "Switch your own off at your account, by password and code.");
  await inTransaction(async (transaction) => {
    await lockPerson(personId, transaction);
    if (!(await removeSecondFactor(personId, transaction)))
      throw new AppError("conflict", "This person has no second factor.");
    const sessionsEnded = await Session.destroy({ where: { personId }, transaction });
    const after = { secondFactor: "reset", sessionsEnded };
    await appendAuditEvent(
      { actorId: actor.id, act: "people", subject: `person ${personId}`, after },
      transaction,
    );
  });
}
