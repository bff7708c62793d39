import type { Transaction } from "sequelize";
import { insert } from "~/services/people/run-sql.server";
import { raiseRevision } from "~/services/revision/raise-revision.server";

interface Recorded {
  actorId: number | null;
  number: string;
  before?: unknown;
  after: unknown;
}

/** Writes what was done to an order into the audit and raises the revision of the orders. */
export async function recordKitOrder(event: Recorded, transaction: Transaction): Promise<void> {
  await insert(
    "INSERT INTO audit_event (actor_id, act, subject, `before`, `after`) VALUES (:actorId, 'kit-orders', :subject, :before, :after)",
    {
      actorId: event.actorId,
      subject: `kit order ${event.number}`,
      before: event.before === undefined ? null : JSON.stringify(event.before),
      after: JSON.stringify(event.after),
    },
    transaction,
  );
  await raiseRevision("orders", transaction);
}
