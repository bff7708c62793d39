import type { Role } from "~/schemas/people/role";

/** Who is asking: a signed-in person, or a program with a token. */
export interface CurrentPerson {
  /** Null for a token that stands for roles alone. */
  id: number | null;
  name: string;
  email: string | null;
  roles: Role[];
  via: "session" | "token";
  /** A manager who has to set up a second factor before anything else; the demo firm asks for none. */
  owesSecondFactor?: true;
}
