import { readRows } from "~/db/read-rows.server";
import type { Role } from "~/schemas/people/role";
import { NO_PASSWORD } from "../links/no-password";

/** Everybody has a place here in one of three ways. */
export type PersonState = "in" | "invited" | "disabled";

export interface ListedPerson {
  id: number;
  name: string;
  email: string;
  roles: Role[];
  state: PersonState;
  /** When a session of theirs was last used or the last act of theirs was done, ISO; null for neither. */
  seenAt: string | null;
}

interface Row {
  id: number;
  name: string;
  email: string;
  roles: string | null;
  state: PersonState;
  seenAt: Date | null;
  actedAt: Date | null;
}

/** Everybody by name, those who are kept out last; or the one with this number. */
export async function findPeople(id: number | null = null): Promise<ListedPerson[]> {
  const rows = await readRows<Row>(
    `SELECT person.id, person.name, person.email,
            (SELECT GROUP_CONCAT(role ORDER BY role) FROM person_role WHERE person_id = person.id) AS roles,
            CASE WHEN person.disabled_at IS NOT NULL THEN 'disabled'
                 WHEN person.password_hash = :none THEN 'invited' ELSE 'in' END AS state,
            (SELECT MAX(seen_at) FROM session WHERE person_id = person.id) AS seenAt,
            (SELECT at FROM audit_event WHERE actor_id = person.id ORDER BY id DESC LIMIT 1) AS actedAt
       FROM person
      WHERE :id IS NULL OR person.id = :id
      ORDER BY person.disabled_at IS NOT NULL, person.name, person.id`,
    { none: NO_PASSWORD, id },
  );
  return rows.map(({ id, roles, seenAt, actedAt, ...row }) => ({
    ...row,
    id: Number(id),
    roles: (roles?.split(",") ?? []) as Role[],
    seenAt: latest(seenAt, actedAt),
  }));
}

function latest(...moments: (Date | null)[]): string | null {
  const times = moments.flatMap((moment) => (moment === null ? [] : [new Date(moment).getTime()]));
  return times.length === 0 ? null : new Date(Math.max(...times)).toISOString();
}
