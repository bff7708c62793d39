import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { RevisionName } from "./revision-name";

/**
 * Raises a revision within the transaction that makes the change, and returns the new number. The row stays locked
 * until the commit, so this comes last; several in the order structure, orders, stock.
 */
export async function raiseRevision(name: RevisionName, transaction: Transaction): Promise<number> {
  const [row] = await sequelize.query<{ value: number }>(
    "INSERT INTO revision (name, value) VALUES (:name, 1) ON DUPLICATE KEY UPDATE value = value + 1 RETURNING value",
    { replacements: { name }, type: QueryTypes.SELECT, transaction },
  );
  return row.value;
}
