import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "./client.server";

/** Flat rows of one SELECT with named parameters, inside the given transaction where there is one. */
export function readRows<Row extends object>(
  statement: string,
  replacements: Record<string, unknown> = {},
  transaction?: Transaction,
): Promise<Row[]> {
  return sequelize.query<Row>(statement, { replacements, type: QueryTypes.SELECT, transaction });
}
