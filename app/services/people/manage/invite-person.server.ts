import { UniqueConstraintError } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { Person } from "~/db/models/people/person";
import { PersonRole } from "~/db/models/people/person-role";
import { invitePersonSchema } from "~/schemas/people/person";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";
import { mailInvitation } from "../links/mail-invitation.server";
import { NO_PASSWORD } from "../links/no-password";

/**
 * Makes a place for a person, who chooses a password by the link in the mail that goes out with it.
 * @param input the form's fields: name, email, roles
 * @returns the person's id
 * @throws AppError `invalid` with errors by field, `conflict` when the address is in use, `forbidden`
 */
export async function invitePerson(input: unknown, actor: CurrentPerson): Promise<number> {
  assertMay(actor, "people");
  const { name, email, roles } = parseInput(invitePersonSchema, input);
  try {
    return await inTransaction(async (transaction) => {
      const { id } = await Person.create({ name, email, passwordHash: NO_PASSWORD }, { transaction });
      for (const role of roles) await PersonRole.create({ personId: id, role }, { transaction });
      const after = { name, email, roles, invited: true };
      await appendAuditEvent(
        { actorId: actor.id, act: "people", subject: `person ${id}`, after },
        transaction,
      );
      await mailInvitation({ id, name, email }, actor.name, transaction);
      return id;
    });
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = "Somebody with this e-mail address is here already.";
    throw new AppError("conflict", message, { errors: [{ field: "email", message }] });
  }
}
