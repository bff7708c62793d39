import { Person } from "~/db/models/people/person";
import { PersonRole } from "~/db/models/people/person-role";
import type { Role } from "~/schemas/people/role";

export const PASSWORD = "a long sentence";

/** Of the password above, at the lowest cost: tests need not wait. */
const PASSWORD_HASH = "$2b$04$8ZQlHE339ARUIycVnLaIYu8ZirSMn.WE7nhf4Hz7Ty0t04o/29672";

/** A person straight in the tables. @returns the person's id */
export async function insertPerson(
  roles: Role[],
  { name = "Wren Adlington", email = "wren@saltmarsh.example" } = {},
): Promise<number> {
  const { id } = await Person.create({ name, email, passwordHash: PASSWORD_HASH });
  for (const role of roles) await PersonRole.create({ personId: id, role });
  return id;
}
