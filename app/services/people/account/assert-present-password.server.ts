import { Person } from "~/db/models/people/person";
import { AppError } from "~/utils/errors";
import { countAttempt, forgiveAttempt } from "../count-attempt.server";
import { verifyPassword } from "../verify-password.server";

interface Asked {
  personId: number;
  password: string;
  /** Where from: tries count like those of signing in. */
  address: string;
  /** Of the form, for the error. */
  field?: string;
}

/**
 * Makes sure that whoever sits at an open session knows the password too.
 * @throws AppError `invalid` at the field, `too-many`
 */
export async function assertPresentPassword({
  personId,
  password,
  address,
  field = "present",
}: Asked): Promise<void> {
  const person = await Person.findByPk(personId, { rejectOnEmpty: true });
  const attempt = await countAttempt({ account: person.email, address });
  if (!(await verifyPassword(password, person.passwordHash))) {
    const message = "This is not your present password.";
    throw new AppError("invalid", message, { errors: [{ field, message }] });
  }
  await forgiveAttempt(attempt);
}
