import { readRows } from "~/db/read-rows.server";
import type { Role } from "~/schemas/people/role";
import { AppError } from "~/utils/errors";
import { findPeople, type ListedPerson } from "./find-people.server";

export interface ListedSession {
  /** The beginning of its hash: enough to name it, nothing to sign in with. */
  key: string;
  browser: string | null;
  address: string | null;
  createdAt: string;
  seenAt: string;
}

export interface ListedToken {
  id: number;
  name: string;
  role: Role | null;
  createdAt: string;
}

interface PersonPage {
  person: ListedPerson;
  sessions: ListedSession[];
  tokens: ListedToken[];
  /** Until when the invitation works, ISO; null where none does. */
  invitedUntil: string | null;
  hasSecondFactor: boolean;
}

/**
 * One person with the sessions and tokens that work.
 * @throws AppError `not-found`
 */
export async function getPersonPage(id: number): Promise<PersonPage> {
  const [person] = await findPeople(id);
  if (!person) throw new AppError("not-found", "There is nobody with this number.");
  const [sessions, tokens, links, factors] = await Promise.all([
    readRows<{ key: string; browser: string | null; address: string | null; createdAt: Date; seenAt: Date }>(
      `SELECT LEFT(id_hash, 16) AS \`key\`, browser, address, created_at AS createdAt, seen_at AS seenAt FROM session
        WHERE person_id = :id AND expires_at > NOW(3) AND seen_at > NOW(3) - INTERVAL 12 HOUR
        ORDER BY seen_at DESC, id_hash`,
      { id },
    ),
    findTokens(id),
    readRows<{ until: Date | null }>(
      `SELECT MAX(expires_at) AS until FROM person_link WHERE person_id = :id AND kind = 'invitation'
          AND used_at IS NULL AND withdrawn_at IS NULL AND expires_at > NOW(3)`,
      { id },
    ),
    readRows<{ one: number }>(
      "SELECT 1 AS one FROM second_factor WHERE person_id = :id AND confirmed_at IS NOT NULL",
      { id },
    ),
  ]);
  return {
    person,
    sessions: sessions.map(({ createdAt, seenAt, ...row }) => ({
      ...row,
      createdAt: new Date(createdAt).toISOString(),
      seenAt: new Date(seenAt).toISOString(),
    })),
    tokens,
    hasSecondFactor: factors.length > 0,
    invitedUntil: links[0]?.until ? new Date(links[0].until).toISOString() : null,
  };
}

/** The tokens that work: of a person, or with null those that stand for a role alone. */
export async function findTokens(personId: number | null): Promise<ListedToken[]> {
  const rows = await readRows<{ id: number; name: string; role: Role | null; createdAt: Date }>(
    `SELECT id, name, role, created_at AS createdAt FROM api_token
      WHERE person_id <=> :personId AND revoked_at IS NULL ORDER BY id`,
    { personId },
  );
  return rows.map(({ id, createdAt, ...row }) => ({
    ...row,
    id: Number(id),
    createdAt: new Date(createdAt).toISOString(),
  }));
}
