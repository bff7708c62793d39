import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { RevisionName } from "./revision-name";

/**
 * The numbers that every change of structure, stock or orders raises: what was computed at the same numbers is
 * still right. One indexed query.
 */
export async function readRevision<Name extends RevisionName>(
  names: readonly Name[],
  options: { transaction?: Transaction } = {},
): Promise<Record<Name, number>> {
  const rows = await sequelize.query<{ name: Name; value: number }>(
    "SELECT name, value FROM revision WHERE name IN (:names)",
    { replacements: { names: [...names] }, type: QueryTypes.SELECT, transaction: options.transaction },
  );
  if (rows.length !== new Set(names).size) throw new Error(`A revision of ${names.join(", ")} is missing.`);
  return Object.fromEntries(rows.map((row) => [row.name, row.value])) as Record<Name, number>;
}
