import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";

type Values = Record<string, unknown>;

/** Reads rows by one statement with named parameters. */
export function select<Row extends object>(
  sql: string,
  values: Values = {},
  transaction?: Transaction,
): Promise<Row[]> {
  return sequelize.query<Row>(sql, { replacements: values, type: QueryTypes.SELECT, transaction });
}

/** Runs one statement that changes rows. @returns the new row's id, if one was added, and how many rows changed */
export async function run(
  sql: string,
  values: Values = {},
  transaction?: Transaction,
): Promise<{ insertId: number; affectedRows: number }> {
  const [result] = await sequelize.query(sql, { replacements: values, transaction });
  return result as unknown as { insertId: number; affectedRows: number };
}
