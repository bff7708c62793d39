import type { Transaction } from "sequelize";
import { PersonRole } from "~/db/models/people/person-role";

/** Whether anybody could manage the shop; without one, the first visitor sets it up. */
export async function hasManager(transaction?: Transaction): Promise<boolean> {
  return (await PersonRole.findOne({ where: { role: "manager" }, transaction })) !== null;
}
