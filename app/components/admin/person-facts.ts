import type { Role } from "~/schemas/people/role";

/** What the pages know of a person. */
export interface PersonFacts {
  id: number;
  name: string;
  email: string;
  roles: Role[];
  state: "in" | "invited" | "disabled";
  seenAt: string | null;
}

export const PERSON_STATES: Record<PersonFacts["state"], string> = {
  in: "may sign in",
  invited: "invited, has not accepted yet",
  disabled: "kept out",
};
