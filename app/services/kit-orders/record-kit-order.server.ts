import type { Transaction } from "sequelize";
import { AuditEvent } from "~/db/models/system/audit-event";
import { raiseRevision } from "~/services/revision/raise-revision.server";

interface Recorded {
  actorId: number | null;
  number: string;
  before?: unknown;
  after: unknown;
}

/** Writes what was done to an order into the audit and raises the revision of the orders. */
export async function recordKitOrder(event: Recorded, transaction: Transaction): Promise<void> {
  await AuditEvent.create(
    {
      actorId: event.actorId,
      act: "kit-orders",
      subject: `kit order ${event.number}`,
      before: event.before ?? null,
      after: event.after,
    },
    { transaction },
  );
  await raiseRevision("orders", transaction);
}
