import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { PostedKind } from "~/domain/stock/types";
import type { Act } from "~/schemas/people/act";
import { ROLE_NAMES, type Role } from "~/schemas/people/role";
import { mayDo, whoMay } from "~/services/people/permissions";
import { AppError } from "~/utils/errors";
import type { StockActor } from "./stock-actor";

/** The acts of which one is needed for each kind. */
const ACTS: Readonly<Record<PostedKind, readonly Act[]>> = {
  receive: ["receive"],
  return: ["pick", "receive"],
  issue: ["pick"],
  scrap: ["scrap", "pick"],
  move: ["move"],
  hold: ["hold"],
  release: ["release-hold"],
  adjust: ["adjust"],
};

/**
 * Asks the right to post inside the transaction, so that a role taken away a moment ago counts.
 * @throws AppError "forbidden", "unauthenticated" for a person who was disabled
 */
export async function assertMayPost(
  actor: StockActor,
  kinds: readonly PostedKind[],
  transaction: Transaction,
): Promise<void> {
  const roles = await rolesNow(actor, transaction);
  const refused = [...new Set(kinds)].find((kind) => !ACTS[kind].some((act) => mayDo(roles, act)));
  if (refused === undefined) return;
  const allowed = [...new Set(ACTS[refused].flatMap(whoMay))].map((role) => ROLE_NAMES[role]);
  throw new AppError("forbidden", `A movement of kind ${refused} is posted by the ${allowed.join(" or ")}.`);
}

/** The roles the actor came with, less those a person no longer has. */
export async function rolesNow(actor: StockActor, transaction: Transaction): Promise<readonly Role[]> {
  if (actor.personId === null) return actor.roles;
  const rows = await sequelize.query<{ role: Role | null; disabled: 0 | 1 }>(
    `SELECT person_role.role, person.disabled_at IS NOT NULL AS disabled FROM person
     LEFT JOIN person_role ON person_role.person_id = person.id WHERE person.id = :personId`,
    { replacements: { personId: actor.personId }, type: QueryTypes.SELECT, transaction },
  );
  if (rows.length === 0 || rows[0].disabled) {
    throw new AppError("unauthenticated", "This account can no longer sign in; ask the manager.");
  }
  return actor.roles.filter((role) => rows.some((row) => row.role === role));
}
