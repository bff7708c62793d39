import { Op } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { SetupCode } from "~/db/models/people/setup-code";
import { setUpSchema } from "~/schemas/people/person";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import { countAttempt, forgiveAttempt } from "./count-attempt.server";
import { createPerson } from "./create-person.server";
import { hasManager } from "./has-manager.server";
import { hashSetupCode } from "./hash-setup-code.server";

/**
 * Makes the first visitor the manager, by the one-time code that the start command printed.
 * @param input the form's fields: code, name, email, password
 * @returns the manager's id
 * @throws AppError `invalid` with errors by field, `conflict` when there is a manager already, `too-many`
 */
export async function setUpManager(input: unknown, address: string): Promise<number> {
  if (await hasManager()) throw alreadySetUp();
  const { code, name, email, password } = parseInput(setUpSchema, input);
  const attempt = await countAttempt({ account: "set-up code", address });
  const id = await inTransaction(async (transaction) => {
    // The update locks the code's row, so of two who use it at once only one goes on.
    const now = new Date();
    const [used] = await SetupCode.update(
      { usedAt: now },
      { where: { codeHash: hashSetupCode(code), usedAt: null, expiresAt: { [Op.gt]: now } }, transaction },
    );
    if (used !== 1) throw wrongCode();
    if (await hasManager(transaction)) throw alreadySetUp();
    return createPerson({ name, email, password, roles: ["manager"] }, { transaction });
  });
  await forgiveAttempt(attempt);
  return id;
}

function alreadySetUp(): AppError {
  return new AppError("conflict", "The shop is set up already. Sign in instead.");
}

function wrongCode(): AppError {
  const message =
    "This is not the code, or it was used already. The start command prints a new one each time.";
  return new AppError("invalid", message, { errors: [{ field: "code", message }] });
}
