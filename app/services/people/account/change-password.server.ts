import { Op } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { HalfSignIn } from "~/db/models/people/half-sign-in";
import { Person } from "~/db/models/people/person";
import { Session } from "~/db/models/people/session";
import { changePasswordSchema } from "~/schemas/people/account";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { parseInput } from "~/utils/request-body";
import type { CurrentPerson } from "../current-person";
import { hashPassword } from "../hash-password.server";
import { withdrawLinks } from "../links/make-link.server";
import { hashSecret } from "../secret.server";
import { assertPresentPassword } from "./assert-present-password.server";
import { ownId } from "./own-id";

interface Here {
  /** The session that goes on. */
  sessionId: string;
  address: string;
}

/**
 * Changes one's own password, ends every other session, and withdraws what was sent for a forgotten one.
 * @param input the form's fields: present, password
 * @returns how many sessions ended
 * @throws AppError `invalid` with errors by field, `too-many`
 */
export async function changePassword(input: unknown, person: CurrentPerson, here: Here): Promise<number> {
  const id = ownId(person);
  const { present, password } = parseInput(changePasswordSchema, input);
  await assertPresentPassword({ personId: id, password: present, address: here.address });
  const passwordHash = await hashPassword(password);
  return inTransaction(async (transaction) => {
    await Person.update({ passwordHash }, { where: { id }, transaction });
    await HalfSignIn.destroy({ where: { personId: id }, transaction });
    const others = { personId: id, idHash: { [Op.ne]: hashSecret(here.sessionId) } };
    const sessionsEnded = await Session.destroy({ where: others, transaction });
    await withdrawLinks(id, transaction);
    const after = { password: "changed", sessionsEnded };
    await appendAuditEvent({ actorId: id, act: "own-account", subject: `person ${id}`, after }, transaction);
    return sessionsEnded;
  });
}
