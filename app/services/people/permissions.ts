import type { Act } from "~/schemas/people/act";
import type { Role } from "~/schemas/people/role";

const EVERYBODY: readonly Role[] = ["clerk", "planner", "purchaser", "builder"];

/**
 * Who may do what besides the manager, who may do all of it. What hangs on the case as well (nobody approves
 * what they counted or raised; a movement is reversed by who made it, the same day) is asked by the service.
 */
export const PERMISSIONS: Readonly<Record<Act, readonly Role[]>> = {
  look: EVERYBODY,
  "see-costs": ["planner", "purchaser"],
  receive: ["clerk", "purchaser"],
  move: ["clerk", "purchaser"],
  "print-labels": ["clerk", "purchaser"],
  adjust: ["clerk"],
  scrap: ["clerk"],
  hold: ["clerk", "purchaser", "builder"],
  "pass-inspection": ["clerk"],
  "release-hold": [],
  count: ["clerk", "builder"],
  "approve-count": ["planner"],
  "reverse-movement": EVERYBODY,
  "edit-parts": ["planner"],
  "import-parts": ["planner"],
  "import-stock": [],
  "import-counts": ["clerk"],
  "import-supply": ["purchaser"],
  "import-suppliers": ["purchaser"],
  "import-offers": ["purchaser"],
  "import-bins": [],
  "import-kit-orders": ["planner"],
  "kit-orders": ["planner"],
  "shop-orders": ["planner"],
  "approve-alternate": ["planner"],
  /** Picking, finishing, returning and scrapping at the bench. */
  pick: ["builder"],
  purchasing: ["purchaser"],
  "approve-purchase": [],
  stage: ["clerk", "builder"],
  "ship-short": ["planner"],
  people: [],
  settings: [],
  audit: [],
  backup: [],
  "own-account": EVERYBODY,
};

/** Whether somebody with these roles may do the act. */
export function mayDo(roles: readonly Role[], act: Act): boolean {
  return roles.some((role) => role === "manager" || PERMISSIONS[act].includes(role));
}

/** The roles that may do the act, the manager last: for the sentence that says who can. */
export function whoMay(act: Act): Role[] {
  return [...PERMISSIONS[act], "manager"];
}
