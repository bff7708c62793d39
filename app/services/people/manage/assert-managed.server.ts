import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { readRows } from "~/db/read-rows.server";
import { AppError } from "~/utils/errors";
import { NO_PASSWORD } from "../links/no-password";

/**
 * Makes sure that somebody is left who can manage the shop: not disabled, with a password. Called after a change and
 * before its commit; `beginManaging` came first, so that two managers do not shut each other out at once.
 * @throws AppError `conflict`
 */
export async function assertManaged(transaction: Transaction): Promise<void> {
  const [{ left }] = await readRows<{ left: number }>(
    `SELECT COUNT(*) AS \`left\` FROM person
       JOIN person_role ON person_role.person_id = person.id AND person_role.role = 'manager'
      WHERE person.disabled_at IS NULL AND person.password_hash <> :none`,
    { none: NO_PASSWORD },
    transaction,
  );
  if (Number(left) > 0) return;
  throw new AppError(
    "conflict",
    "Nobody would be left to manage the shop. Make somebody else a manager first; an invitation counts once it is accepted.",
  );
}

/** One change of people at a time: locks the managers' rows, lowest number first, before anything is read. */
export async function beginManaging(transaction: Transaction): Promise<void> {
  await sequelize.query(
    `SELECT person.id FROM person
       JOIN person_role ON person_role.person_id = person.id AND person_role.role = 'manager'
      ORDER BY person.id FOR UPDATE`,
    { type: QueryTypes.SELECT, transaction },
  );
}
