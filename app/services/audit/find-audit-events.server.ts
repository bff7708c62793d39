import { readRows } from "~/db/read-rows.server";
import type { AuditSearch } from "~/schemas/people/audit-search";
import { auditConditions } from "./audit-conditions";

export interface ListedEvent {
  id: number;
  /** ISO moment. */
  at: string;
  /** Null for the program itself and for tokens without a person. */
  who: string | null;
  act: string;
  subject: string;
  /** JSON, or null. */
  before: string | null;
  after: string | null;
}

interface AuditPage {
  events: ListedEvent[];
  /** Goes on below this number; null at the end. */
  next: number | null;
}

interface Row extends Omit<ListedEvent, "at" | "before" | "after"> {
  at: Date;
  before: unknown;
  after: unknown;
}

/** Events of the audit, newest first, below a number where one is given. */
export async function findAuditEvents(
  search: AuditSearch,
  { below = null, size = 50 }: { below?: number | null; size?: number } = {},
): Promise<AuditPage> {
  const { where, replacements } = auditConditions(search);
  const rows = await readRows<Row>(
    `SELECT audit_event.id, audit_event.at, person.name AS who, audit_event.act, audit_event.subject,
            audit_event.before, audit_event.after
       FROM audit_event LEFT JOIN person ON person.id = audit_event.actor_id
      WHERE ${where} AND (:below IS NULL OR audit_event.id < :below)
      ORDER BY audit_event.id DESC LIMIT :limit`,
    { ...replacements, below, limit: size + 1 },
  );
  const events = rows.slice(0, size).map(presentEvent);
  return { events, next: rows.length > size ? (events.at(-1)?.id ?? null) : null };
}

function presentEvent({ at, before, after, ...row }: Row): ListedEvent {
  return {
    ...row,
    id: Number(row.id),
    at: new Date(at).toISOString(),
    before: asText(before),
    after: asText(after),
  };
}

function asText(value: unknown): string | null {
  if (value === null || value === undefined) return null;
  return typeof value === "string" ? value : JSON.stringify(value);
}
