import type { Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";

/** One statement that changes or deletes rows, with named parameters. */
export async function runStatement(
  sql: string,
  replacements: Record<string, unknown>,
  transaction: Transaction,
): Promise<void> {
  await sequelize.query(sql, { replacements, transaction });
}
