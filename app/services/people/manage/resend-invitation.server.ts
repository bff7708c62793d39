import { inTransaction } from "~/db/in-transaction.server";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";
import { mailInvitation } from "../links/mail-invitation.server";
import { NO_PASSWORD } from "../links/no-password";
import { lockPerson } from "./lock-person.server";

/**
 * Sends a person who has not accepted yet another invitation; the one before stops working.
 * @throws AppError `not-found`, `forbidden`, `conflict` when they have a password or are disabled
 */
export async function resendInvitation(id: number, actor: CurrentPerson): Promise<void> {
  assertMay(actor, "people");
  await inTransaction(async (transaction) => {
    const { person } = await lockPerson(id, transaction);
    if (person.disabledAt !== null) throw new AppError("conflict", "Let this person in again first.");
    if (person.passwordHash !== NO_PASSWORD)
      throw new AppError("conflict", "This person has accepted already and can sign in.");
    await mailInvitation(person, actor.name, transaction);
    const after = { invited: "again" };
    await appendAuditEvent({ actorId: actor.id, act: "people", subject: `person ${id}`, after }, transaction);
  });
}
