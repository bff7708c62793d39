import { inTransaction } from "~/db/in-transaction.server";
import { Person } from "~/db/models/people/person";
import { forgottenSchema } from "~/schemas/people/person";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { queueMail } from "~/services/mail/queue-mail.server";
import { ownAddress } from "~/utils/own-address";
import { parseInput } from "~/utils/request-body";
import { countAttempt } from "../count-attempt.server";
import { makeLink } from "./make-link.server";

/** More than the work below takes, so that the time says nothing of whether the address is known. */
const ANSWER_MILLISECONDS = 500;

/**
 * Sends a link for a new password to the address, if somebody who may sign in has it. The answer and its time are the
 * same in any case.
 * @param input the form's field: email
 * @throws AppError `invalid` for what is no address, `too-many`
 */
export async function askNewPassword(input: unknown, address: string): Promise<void> {
  const { email } = parseInput(forgottenSchema, input);
  await countAttempt({ account: `forgotten ${email}`, address });
  const pause = new Promise((resolve) => setTimeout(resolve, ANSWER_MILLISECONDS));
  await Promise.all([mailNewPassword(email), pause]);
}

function mailNewPassword(email: string): Promise<void> {
  return inTransaction(async (transaction) => {
    const person = await Person.findOne({ where: { email, disabledAt: null }, transaction, lock: true });
    if (!person) return;
    const secret = await makeLink(person.id, "password", transaction);
    const body = `Hello ${person.name},

somebody, most likely you, asked for a new password for Cotterpin. Choose it here:

${ownAddress()}/new-password/${secret}

The link works once, within an hour. If it was not you, leave this mail: your password stays as it is.
`;
    await queueMail({ to: email, subject: "A new password for Cotterpin", body }, transaction);
    const subject = `person ${person.id}`;
    const after = { password: "link sent" };
    await appendAuditEvent({ actorId: null, act: "own-account", subject, after }, transaction);
  });
}
