import { inTransaction } from "~/db/in-transaction.server";
import { acceptInvitationSchema } from "~/schemas/people/person";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { parseInput } from "~/utils/request-body";
import { hashPassword } from "../hash-password.server";
import { useLink } from "./use-link.server";

/**
 * Lets an invited person choose the name they go by and a password.
 * @param input the form's fields: name, password
 * @returns the person's id
 * @throws AppError `invalid` with errors by field, `conflict` when the invitation does not work any more
 */
export async function acceptInvitation(secret: string, input: unknown): Promise<number> {
  const { name, password } = parseInput(acceptInvitationSchema, input);
  const passwordHash = await hashPassword(password);
  return inTransaction(async (transaction) => {
    const person = await useLink(secret, "invitation", transaction);
    const before = { name: person.name };
    await person.update({ name, passwordHash }, { transaction });
    await appendAuditEvent(
      {
        actorId: person.id,
        act: "own-account",
        subject: `person ${person.id}`,
        before,
        after: { name, password: "chosen" },
      },
      transaction,
    );
    return person.id;
  });
}
