import { z } from "zod";

const text = (most: number) => z.string().trim().max(most).optional().catch(undefined);
const day = z.iso.date().optional().catch(undefined);

/** What the audit can be asked for. What cannot be read is left out. */
export const auditSearchSchema = z.object({
  /** Part of a name or an e-mail address. */
  who: text(120),
  act: text(64),
  /** Part of what it was done to. */
  subject: text(200),
  from: day,
  to: day,
  /** Part of what was written down before or after. */
  text: text(120),
});

export type AuditSearch = z.output<typeof auditSearchSchema>;

/** Reads a search from an address; empty fields ask for nothing. */
export function readAuditSearch(parameters: URLSearchParams): AuditSearch {
  const filled = [...parameters].filter(([, value]) => value.trim() !== "");
  return auditSearchSchema.parse(Object.fromEntries(filled));
}
