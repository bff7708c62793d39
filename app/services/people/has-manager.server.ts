import type { Transaction } from "sequelize";
import { select } from "./run-sql.server";

/** Whether anybody could manage the shop; without one, the first visitor sets it up. */
export async function hasManager(transaction?: Transaction): Promise<boolean> {
  const rows = await select("SELECT 1 FROM person_role WHERE role = 'manager' LIMIT 1", {}, transaction);
  return rows.length > 0;
}
