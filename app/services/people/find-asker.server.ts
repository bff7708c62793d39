import { Session } from "~/db/models/people/session";
import { readRows } from "~/db/read-rows.server";
import type { Role } from "~/schemas/people/role";
import { readSessionId } from "~/utils/session-cookie";
import type { CurrentPerson } from "./current-person";
import { hashSecret } from "./secret.server";

interface AskerRow {
  id: number | null;
  name: string;
  email: string | null;
  role: Role | null;
  stale?: number;
  lacksFactor?: number;
}

/**
 * Who sends these headers: by token where the address takes tokens, else by session cookie. A token that is sent
 * counts alone, so that a page elsewhere cannot borrow the cookie beside it. Disabled people are nobody.
 */
export async function findAsker(
  headers: Headers,
  options: { tokens: boolean },
): Promise<CurrentPerson | null> {
  const bearer = /^Bearer +(\S+)$/i.exec(headers.get("Authorization") ?? "");
  if (options.tokens && headers.has("Authorization")) return bearer ? findByToken(bearer[1]) : null;
  const sessionId = readSessionId(headers);
  return sessionId ? findBySession(sessionId) : null;
}

async function findByToken(token: string): Promise<CurrentPerson | null> {
  const rows = await readRows<AskerRow>(
    `SELECT person.id, COALESCE(person.name, api_token.name) AS name, person.email,
            CASE WHEN api_token.role IS NULL OR api_token.person_id IS NULL OR api_token.role = person_role.role
                   OR person_role.role = 'manager'
                 THEN COALESCE(api_token.role, person_role.role) END AS role
       FROM api_token
       LEFT JOIN person ON person.id = api_token.person_id
       LEFT JOIN person_role ON person_role.person_id = person.id
      WHERE api_token.token_hash = :hash AND api_token.revoked_at IS NULL AND person.disabled_at IS NULL`,
    { hash: hashSecret(token) },
  );
  return present(rows, "token");
}

/** A session ends after 12 hours without a request, and after seven days in any case. */
async function findBySession(id: string): Promise<CurrentPerson | null> {
  const hash = hashSecret(id);
  const rows = await readRows<AskerRow>(
    `SELECT person.id, person.name, person.email, person_role.role,
            session.seen_at < NOW(3) - INTERVAL 5 MINUTE AS stale,
            second_factor.confirmed_at IS NULL
              AND NOT EXISTS (SELECT 1 FROM setting WHERE setting.name = 'demo' AND setting.value = 'true') AS lacksFactor
       FROM session
       JOIN person ON person.id = session.person_id
       LEFT JOIN person_role ON person_role.person_id = person.id
       LEFT JOIN second_factor ON second_factor.person_id = person.id
      WHERE session.id_hash = :hash AND session.expires_at > NOW(3)
        AND session.seen_at > NOW(3) - INTERVAL 12 HOUR AND person.disabled_at IS NULL`,
    { hash },
  );
  if (rows[0]?.stale) await Session.update({ seenAt: new Date() }, { where: { idHash: hash } });
  return present(rows, "session");
}

function present(rows: AskerRow[], via: CurrentPerson["via"]): CurrentPerson | null {
  if (rows.length === 0) return null;
  const [{ id, name, email, lacksFactor }] = rows;
  const roles = new Set(rows.flatMap(({ role }) => (role === null ? [] : [role])));
  const asker = { id, name, email, roles: [...roles], via };
  return lacksFactor && roles.has("manager") ? { ...asker, owesSecondFactor: true } : asker;
}
