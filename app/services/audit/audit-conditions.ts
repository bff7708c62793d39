import type { AuditSearch } from "~/schemas/people/audit-search";

/** `%` and `_` stand for themselves in what people type. */
const part = (text: string) => `%${text.replace(/[\\%_]/g, "\\$&")}%`;

const CONDITIONS: Record<keyof AuditSearch, string> = {
  who: "(person.name LIKE :who OR person.email LIKE :who)",
  act: "audit_event.act = :act",
  subject: "audit_event.subject LIKE :subject COLLATE utf8mb4_unicode_ci",
  from: "audit_event.at >= :from",
  to: "audit_event.at < :to + INTERVAL 1 DAY",
  text: "CONCAT_WS(' ', audit_event.before, audit_event.after) LIKE :text COLLATE utf8mb4_unicode_ci",
};

interface AuditConditions {
  where: string;
  replacements: Record<string, string>;
}

/** The conditions of a search and their values. */
export function auditConditions(search: AuditSearch): AuditConditions {
  const keys = (Object.keys(CONDITIONS) as (keyof AuditSearch)[]).filter((key) => search[key] !== undefined);
  const value = (key: keyof AuditSearch) => {
    const text = search[key] ?? "";
    return key === "who" || key === "subject" || key === "text" ? part(text) : text;
  };
  return {
    where: ["TRUE", ...keys.map((key) => CONDITIONS[key])].join(" AND "),
    replacements: Object.fromEntries(keys.map((key) => [key, value(key)])),
  };
}
