import type { Act } from "~/schemas/people/act";
import { ROLE_NAMES, type Role } from "~/schemas/people/role";
import { AppError } from "~/utils/errors";
import type { CurrentPerson } from "./current-person";
import { mayDo, whoMay } from "./permissions";

/**
 * The person, if they may do the act; the guard asks it at the door and services again inside their transaction.
 * @throws AppError `unauthenticated` without a person, `forbidden` with a sentence that says who can
 */
export function assertMay(person: CurrentPerson | null, act: Act): CurrentPerson {
  if (!person) throw new AppError("unauthenticated", "Sign in first, or send a valid token.");
  if (mayDo(person.roles, act)) return person;
  throw new AppError(
    "forbidden",
    `This is for the ${listRoles(whoMay(act))}. You are here as ${listRoles(person.roles) || "somebody without a role"}.`,
  );
}

function listRoles(roles: readonly Role[]): string {
  const names = roles.map((role) => ROLE_NAMES[role]);
  return names.length < 2 ? names.join("") : `${names.slice(0, -1).join(", ")} or ${names.at(-1)}`;
}
