import { z } from "zod";

export const ROLES = ["clerk", "planner", "purchaser", "builder", "manager"] as const;

export type Role = (typeof ROLES)[number];

export const roleSchema = z.enum(ROLES, { error: `A role is one of ${ROLES.join(", ")}.` });

/** The roles as people call them. */
export const ROLE_NAMES: Record<Role, string> = {
  clerk: "stock clerk",
  planner: "planner",
  purchaser: "purchaser",
  builder: "builder",
  manager: "manager",
};
