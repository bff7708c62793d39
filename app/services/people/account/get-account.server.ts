import { ROLES, type Role } from "~/schemas/people/role";
import type { CurrentPerson } from "../current-person";
import { getPersonPage, type ListedSession, type ListedToken } from "../manage/get-person-page.server";
import { getSecondFactor, type SecondFactorFacts } from "../second-factor/get-second-factor.server";
import { hashSecret } from "../secret.server";
import { ownId } from "./own-id";

interface Account {
  name: string;
  email: string | null;
  sessions: (ListedSession & { isThis: boolean })[];
  tokens: ListedToken[];
  secondFactor: SecondFactorFacts;
  /** Nothing else can be done before it is set up. */
  owesSecondFactor: boolean;
  /** That a token of theirs may have. */
  roles: Role[];
}

/** What a person sees of their own account: sessions and tokens that work. */
export async function getAccount(person: CurrentPerson, sessionId: string): Promise<Account> {
  const { sessions, tokens } = await getPersonPage(ownId(person));
  const key = hashSecret(sessionId).slice(0, 16);
  return {
    name: person.name,
    email: person.email,
    sessions: sessions.map((session) => ({ ...session, isThis: session.key === key })),
    tokens,
    secondFactor: await getSecondFactor(person),
    owesSecondFactor: person.owesSecondFactor ?? false,
    roles: person.roles.includes("manager") ? [...ROLES] : person.roles,
  };
}
