import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { readRevision } from "./read-revision.server";
import type { RevisionName } from "./revision-name";

/**
 * Raises a revision within the transaction that makes the change, and returns the new number. The row stays locked
 * until the commit, so this comes last; several in the order structure, orders, stock.
 */
export async function raiseRevision(name: RevisionName, transaction: Transaction): Promise<number> {
  await sequelize.query("UPDATE revision SET value = value + 1 WHERE name = :name", {
    replacements: { name },
    type: QueryTypes.UPDATE,
    transaction,
  });
  return (await readRevision([name], { transaction }))[name];
}
