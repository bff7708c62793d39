import type { Role } from "~/schemas/people/role";

/** The invented people of the demo firm; everybody may know their password. */
export const DEMO_PASSWORD = "saltmarsh-demo-2026";

export const DEMO_PEOPLE: readonly { role: Role; name: string; email: string }[] = [
  { role: "planner", name: "Idris Fenwick", email: "idris@saltmarsh.example" },
  { role: "clerk", name: "Wren Adlington", email: "wren@saltmarsh.example" },
  { role: "purchaser", name: "Maud Okonjo", email: "maud@saltmarsh.example" },
  { role: "builder", name: "Tam Sorley", email: "tam@saltmarsh.example" },
  { role: "manager", name: "Greta Lindqvist", email: "greta@saltmarsh.example" },
];
