import { inTransaction } from "~/db/in-transaction.server";
import { ApiToken } from "~/db/models/people/api-token";
import { ownTokenSchema } from "~/schemas/people/account";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import type { CurrentPerson } from "../current-person";
import { hashSecret, newSecret } from "../secret.server";
import { ownId } from "./own-id";

/**
 * Makes a token that does what one of one's own roles may, as long as one has it.
 * @param input the form's fields: name, role
 * @returns the token, which is shown once; only its hash is kept
 * @throws AppError `invalid` with errors by field, `conflict` for a manager who owes a second factor
 */
export async function makeOwnToken(input: unknown, person: CurrentPerson): Promise<string> {
  const personId = ownId(person);
  if (person.owesSecondFactor)
    throw new AppError("conflict", "Set up your second factor first, then make tokens.");
  const { name, role } = parseInput(ownTokenSchema, input);
  if (!person.roles.includes(role) && !person.roles.includes("manager")) {
    const message = "A token can have only a role that you have.";
    throw new AppError("invalid", message, { errors: [{ field: "role", message }] });
  }
  const token = newSecret();
  await inTransaction(async (transaction) => {
    await ApiToken.create({ tokenHash: hashSecret(token), personId, role, name }, { transaction });
    const after = { tokenMade: name, role };
    await appendAuditEvent(
      { actorId: personId, act: "own-account", subject: `person ${personId}`, after },
      transaction,
    );
  });
  return token;
}
