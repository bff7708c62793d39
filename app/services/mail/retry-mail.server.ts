import { inTransaction } from "~/db/in-transaction.server";
import { OutboxMail } from "~/db/models/system/outbox-mail";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { AppError } from "~/utils/errors";

/**
 * Gives a mail that was given up eight tries more, from now on.
 * @throws AppError `conflict` when it is not given up, `forbidden`
 */
export async function retryMail(id: number, actor: CurrentPerson): Promise<void> {
  assertMay(actor, "settings");
  await inTransaction(async (transaction) => {
    const [changed] = await OutboxMail.update(
      { state: "waiting", tries: 0, nextAt: new Date(), endedAt: null, leaseUntil: null },
      { where: { id, state: "dead" }, transaction },
    );
    if (changed !== 1) throw new AppError("conflict", "This mail is not given up: it needs no other try.");
    const change = { before: { state: "given up" }, after: { state: "waiting" } };
    await appendAuditEvent(
      { actorId: actor.id, act: "settings", subject: `mail ${id}`, ...change },
      transaction,
    );
  });
}
