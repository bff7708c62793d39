import { ACTS, type Act } from "~/schemas/people/act";
import type { Role } from "~/schemas/people/role";
import type { CurrentPerson } from "./current-person";
import { mayDo } from "./permissions";

/** What pages know of the person in front of them. */
export interface PresentedPerson {
  name: string;
  roles: Role[];
  may: Act[];
}

export function presentPerson(person: CurrentPerson): PresentedPerson {
  return { name: person.name, roles: person.roles, may: ACTS.filter((act) => mayDo(person.roles, act)) };
}
