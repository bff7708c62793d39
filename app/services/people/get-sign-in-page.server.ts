import { Setting } from "~/db/models/system/setting";
import { ROLE_NAMES, type Role } from "~/schemas/people/role";
import { DEMO_PASSWORD, DEMO_PEOPLE } from "./demo-people";
import { hasManager } from "./has-manager.server";

interface DemoChoice {
  role: Role;
  roleName: string;
  name: string;
  email: string;
  password: string;
}

/** What the sign-in page shows: the people of the demo, if this is one, and whether somebody has to set up first. */
export async function getSignInPage(): Promise<{ demo: DemoChoice[]; needsSetUp: boolean }> {
  const setting = await Setting.findByPk("demo");
  if (setting?.value !== true) return { demo: [], needsSetUp: !(await hasManager()) };
  const demo = DEMO_PEOPLE.map((person) => ({
    ...person,
    roleName: ROLE_NAMES[person.role],
    password: DEMO_PASSWORD,
  }));
  return { demo, needsSetUp: false };
}
