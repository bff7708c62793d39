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

/** Adds one row by an `INSERT INTO`. @returns the row's id, where the table gives ids */
export async function insert(sql: string, values: Values = {}, transaction?: Transaction): Promise<number> {
  const [id] = await sequelize.query(sql, { replacements: values, type: QueryTypes.INSERT, transaction });
  return Number(id);
}

/** Runs one statement that changes or deletes rows. @returns how many */
export async function run(sql: string, values: Values = {}, transaction?: Transaction): Promise<number> {
  const [result] = await sequelize.query(sql, { replacements: values, transaction });
  return (result as unknown as { affectedRows: number }).affectedRows;
}
