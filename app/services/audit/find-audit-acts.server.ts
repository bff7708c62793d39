import { readRows } from "~/db/read-rows.server";

/** The acts that the audit knows of, by name. */
export async function findAuditActs(): Promise<string[]> {
  const rows = await readRows<{ act: string }>("SELECT DISTINCT act FROM audit_event ORDER BY act");
  return rows.map(({ act }) => act);
}
