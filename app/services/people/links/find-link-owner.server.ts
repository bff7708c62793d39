import { readRows } from "~/db/read-rows.server";
import { hashSecret } from "../secret.server";
import type { LinkKind } from "./make-link.server";

interface LinkOwner {
  id: number;
  name: string;
  email: string;
}

/** Whose link this is, if it still works: not used, not withdrawn, in time, its person not disabled. */
export async function findLinkOwner(secret: string, kind: LinkKind): Promise<LinkOwner | null> {
  const [owner] = await readRows<LinkOwner>(
    `SELECT person.id, person.name, person.email
       FROM person_link
       JOIN person ON person.id = person_link.person_id AND person.disabled_at IS NULL
      WHERE person_link.link_hash = :hash AND person_link.kind = :kind AND person_link.used_at IS NULL
        AND person_link.withdrawn_at IS NULL AND person_link.expires_at > NOW(3)`,
    { hash: hashSecret(secret), kind },
  );
  return owner ? { ...owner, id: Number(owner.id) } : null;
}
