import { inTransaction } from "~/db/in-transaction.server";
import { ApiToken } from "~/db/models/people/api-token";
import { Session } from "~/db/models/people/session";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { assertMay } from "../assert-may.server";
import type { CurrentPerson } from "../current-person";
import { withdrawLinks } from "../links/make-link.server";
import { assertManaged, beginManaging } from "./assert-managed.server";
import { lockPerson } from "./lock-person.server";

/**
 * Keeps a person out: sessions and tokens end at once and for good, links by mail stop working.
 * @throws AppError `not-found`, `forbidden`, `conflict` when no manager would be left
 */
export async function disablePerson(id: number, actor: CurrentPerson): Promise<void> {
  assertMay(actor, "people");
  await inTransaction(async (transaction) => {
    await beginManaging(transaction);
    const { person } = await lockPerson(id, transaction);
    if (person.disabledAt !== null) return;
    const now = new Date();
    await person.update({ disabledAt: now }, { transaction });
    await assertManaged(transaction);
    const sessionsEnded = await Session.destroy({ where: { personId: id }, transaction });
    const [tokensEnded] = await ApiToken.update(
      { revokedAt: now },
      { where: { personId: id, revokedAt: null }, transaction },
    );
    await withdrawLinks(id, transaction);
    await appendAuditEvent(
      {
        actorId: actor.id,
        act: "people",
        subject: `person ${id}`,
        before: { disabled: false },
        after: { disabled: true, sessionsEnded, tokensEnded },
      },
      transaction,
    );
  });
}
