import { inTransaction } from "~/db/in-transaction.server";
import { HalfSignIn } from "~/db/models/people/half-sign-in";
import { Session } from "~/db/models/people/session";
import { choosePasswordSchema } from "~/schemas/people/person";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { parseInput } from "~/utils/request-body";
import { hashPassword } from "../hash-password.server";
import { useLink } from "./use-link.server";

/**
 * Sets a new password by the link of a mail and ends every session of the person, who signs in again with it.
 * @param input the form's field: password
 * @throws AppError `invalid` with errors by field, `conflict` when the link does not work any more
 */
export async function setNewPassword(secret: string, input: unknown): Promise<void> {
  const { password } = parseInput(choosePasswordSchema, input);
  const passwordHash = await hashPassword(password);
  await inTransaction(async (transaction) => {
    const person = await useLink(secret, "password", transaction);
    await person.update({ passwordHash }, { transaction });
    await HalfSignIn.destroy({ where: { personId: person.id }, transaction });
    const ended = await Session.destroy({ where: { personId: person.id }, transaction });
    const after = { password: "changed", sessionsEnded: ended };
    const subject = `person ${person.id}`;
    await appendAuditEvent({ actorId: person.id, act: "own-account", subject, after }, transaction);
  });
}
