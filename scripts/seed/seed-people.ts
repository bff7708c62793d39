import { createPerson } from "~/services/people/create-person.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { DEMO_PASSWORD, DEMO_PEOPLE } from "~/services/people/demo-people";

/** Makes the five people of the demo firm; gives the manager, in whose name the rest comes in. */
export async function seedPeople(): Promise<CurrentPerson> {
  let manager: CurrentPerson | undefined;
  for (const { name, email, role } of DEMO_PEOPLE) {
    const id = await createPerson({ name, email, password: DEMO_PASSWORD, roles: [role] });
    if (role === "manager") manager = { id, name, email, roles: [role], via: "session" };
  }
  if (manager === undefined) throw new Error("The demo firm has no manager.");
  return manager;
}
