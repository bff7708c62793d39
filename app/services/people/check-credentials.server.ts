import { Person } from "~/db/models/people/person";
import { AppError } from "~/utils/errors";
import { countAttempt, forgiveAttempt } from "./count-attempt.server";
import { verifyPassword } from "./verify-password.server";

interface Credentials {
  /** In small letters. */
  email: string;
  password: string;
  address: string;
}

/**
 * The id of the person whose address and password these are. Wrong password, unknown and disabled people get the
 * same answer after the same time.
 * @throws AppError `invalid` when they do not go together, `too-many` after too many tries
 */
export async function checkCredentials({ email, password, address }: Credentials): Promise<number> {
  const attempt = await countAttempt({ account: email, address });
  const person = await Person.findOne({ where: { email, disabledAt: null } });
  const fits = await verifyPassword(password, person?.passwordHash);
  if (!person || !fits) {
    throw new AppError(
      "invalid",
      "This e-mail address and password do not go together. Try again, or have a link for a new password sent to you.",
    );
  }
  await forgiveAttempt(attempt);
  return person.id;
}
