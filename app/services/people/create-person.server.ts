import { type Transaction, UniqueConstraintError } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { Person } from "~/db/models/people/person";
import { PersonRole } from "~/db/models/people/person-role";
import { AuditEvent } from "~/db/models/system/audit-event";
import { newPersonSchema } from "~/schemas/people/person";
import type { Role } from "~/schemas/people/role";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import { hashPassword } from "./hash-password.server";

interface NewPerson {
  name: string;
  email: string;
  password: string;
  roles: Role[];
}

interface Options {
  /** Joins a transaction that is under way. */
  transaction?: Transaction;
  /** Who does it, for the audit; null for the program itself. */
  actorId?: number | null;
}

/**
 * Adds a person with roles and a password, and writes it into the audit.
 * @returns the person's id
 * @throws AppError `invalid` with errors by field, `conflict` when the e-mail address is in use
 */
export async function createPerson(input: NewPerson, options: Options = {}): Promise<number> {
  const person = parseInput(newPersonSchema, input);
  const passwordHash = await hashPassword(person.password);
  try {
    return await inTransaction(
      (transaction) => insertPerson(person, passwordHash, options.actorId ?? null, transaction),
      {
        transaction: options.transaction,
      },
    );
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
    const message = "Somebody with this e-mail address is here already.";
    throw new AppError("conflict", message, { errors: [{ field: "email", message }] });
  }
}

async function insertPerson(
  person: NewPerson,
  passwordHash: string,
  actorId: number | null,
  transaction: Transaction,
) {
  const { name, email } = person;
  const roles = [...new Set(person.roles)];
  const { id } = await Person.create({ name, email, passwordHash }, { transaction });
  for (const role of roles) await PersonRole.create({ personId: id, role }, { transaction });
  await AuditEvent.create(
    { actorId, act: "people", subject: `person ${id}`, after: { name, email, roles } },
    { transaction },
  );
  return id;
}
