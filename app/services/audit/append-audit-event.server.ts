import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";

interface AuditEntry {
  /** Null for the program itself and for tokens without a person. */
  actorId: number | null;
  act: string;
  /** What it was done to: `part HB-2041`, `movement 17`. */
  subject: string;
  before?: unknown;
  after?: unknown;
}

/** Adds to the audit, within the transaction that does the act. */
export async function appendAuditEvent(entry: AuditEntry, transaction: Transaction): Promise<void> {
  const { actorId, act, subject } = entry;
  const replacements = { actorId, act, subject, before: asJson(entry.before), after: asJson(entry.after) };
  await sequelize.query(
    "INSERT INTO audit_event (actor_id, act, subject, `before`, `after`) VALUES (:actorId, :act, :subject, :before, :after)",
    { replacements, type: QueryTypes.INSERT, transaction },
  );
}

function asJson(value: unknown): string | null {
  return value === undefined || value === null ? null : JSON.stringify(value);
}
