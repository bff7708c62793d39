import { inTransaction } from "~/db/in-transaction.server";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";
import { lockPerson } from "./lock-person.server";

/**
 * Lets a disabled person in again, with the password they had.
 * @throws AppError `not-found`, `forbidden`
 */
export async function enablePerson(id: number, actor: CurrentPerson): Promise<void> {
  assertMay(actor, "people");
  await inTransaction(async (transaction) => {
    const { person } = await lockPerson(id, transaction);
    if (person.disabledAt === null) return;
    await person.update({ disabledAt: null }, { transaction });
    const change = { before: { disabled: true }, after: { disabled: false } };
    await appendAuditEvent(
      { actorId: actor.id, act: "people", subject: `person ${id}`, ...change },
      transaction,
    );
  });
}
