import type { Transaction } from "sequelize";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { raiseRevision } from "~/services/revision/raise-revision.server";

interface Recorded {
  actorId: number | null;
  number: string;
  before?: unknown;
  after: unknown;
}

/** Writes what was done to an order into the audit and raises the revision of the orders. */
export async function recordKitOrder(event: Recorded, transaction: Transaction): Promise<void> {
  const { actorId, number, before, after } = event;
  await appendAuditEvent(
    { actorId, act: "kit-orders", subject: `kit order ${number}`, before, after },
    transaction,
  );
  await raiseRevision("orders", transaction);
}
