import type { Role } from "~/schemas/people/role";
import type { CurrentPerson } from "~/services/people/current-person";

/** A person who acts, as the guard hands them to services. */
export function asActor(id: number, roles: Role[] = ["manager"]): CurrentPerson {
  return { id, name: "Greta Lindqvist", email: "greta@saltmarsh.example", roles, via: "session" };
}
