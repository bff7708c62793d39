import { inTransaction } from "~/db/in-transaction.server";
import { PersonRole } from "~/db/models/people/person-role";
import { Session } from "~/db/models/people/session";
import { changeRolesSchema } from "~/schemas/people/person";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { parseInput } from "~/utils/request-body";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";
import { assertManaged, beginManaging } from "./assert-managed.server";
import { lockPerson } from "./lock-person.server";

/**
 * Gives a person other roles. Their sessions end, so that nothing begun under the old rights goes on.
 * @param input the form's field: roles
 * @throws AppError `invalid`, `not-found`, `forbidden`, `conflict` when no manager would be left
 */
export async function changeRoles(id: number, input: unknown, actor: CurrentPerson): Promise<void> {
  assertMay(actor, "people");
  const { roles } = parseInput(changeRolesSchema, input);
  await inTransaction(async (transaction) => {
    await beginManaging(transaction);
    const { roles: before } = await lockPerson(id, transaction);
    if (before.length === roles.length && before.every((role) => roles.includes(role))) return;
    await PersonRole.destroy({ where: { personId: id }, transaction });
    for (const role of roles) await PersonRole.create({ personId: id, role }, { transaction });
    await assertManaged(transaction);
    await Session.destroy({ where: { personId: id }, transaction });
    const subject = `person ${id}`;
    await appendAuditEvent(
      { actorId: actor.id, act: "people", subject, before: { roles: before }, after: { roles } },
      transaction,
    );
  });
}
