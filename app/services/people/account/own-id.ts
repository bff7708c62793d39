import { AppError } from "~/utils/errors";
import type { CurrentPerson } from "../current-person";

/**
 * The number of a person at their own account. Tokens have no account to change, so that a stolen one cannot make others.
 * @throws AppError `forbidden`
 */
export function ownId({ id, via }: CurrentPerson): number {
  if (id !== null && via === "session") return id;
  throw new AppError("forbidden", "An account is changed by its person, signed in, not by a token.");
}
