import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { Role } from "~/schemas/people/role";
import { AppError } from "~/utils/errors";
import type { StockActor } from "./stock-actor";

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
