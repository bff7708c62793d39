import type { Transaction } from "sequelize";
import { Person } from "~/db/models/people/person";
import { PersonRole } from "~/db/models/people/person-role";
import type { Role } from "~/schemas/people/role";
import { AppError } from "~/utils/errors";

interface LockedPerson {
  person: Person;
  roles: Role[];
}

/**
 * The person, locked, with their roles.
 * @throws AppError `not-found`
 */
export async function lockPerson(id: number, transaction: Transaction): Promise<LockedPerson> {
  const person = await Person.findByPk(id, { transaction, lock: true });
  if (!person) throw new AppError("not-found", "There is nobody with this number.");
  const rows = await PersonRole.findAll({ where: { personId: id }, transaction });
  return { person, roles: rows.map(({ role }) => role) };
}
