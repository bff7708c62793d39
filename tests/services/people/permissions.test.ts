import { describe, expect, it } from "vitest";
import { ACTS, type Act } from "~/schemas/people/act";
import { ROLES, type Role } from "~/schemas/people/role";
import { mayDo, PERMISSIONS, whoMay } from "~/services/people/permissions";

/** The table once more, as a picture: c clerk, p planner, u purchaser, b builder; the manager may do all. */
const EXPECTED: Record<Act, string> = {
  look: "cpub",
  "see-costs": "pu",
  receive: "cu",
  move: "cu",
  "print-labels": "cu",
  adjust: "c",
  scrap: "c",
  hold: "cub",
  "pass-inspection": "c",
  "release-hold": "",
  count: "cb",
  "approve-count": "p",
  "reverse-movement": "cpub",
  "edit-parts": "p",
  "import-parts": "p",
  "import-stock": "",
  "import-counts": "c",
  "import-supply": "u",
  "import-suppliers": "u",
  "import-offers": "u",
  "import-bins": "",
  "import-kit-orders": "p",
  "kit-orders": "p",
  "shop-orders": "p",
  "approve-alternate": "p",
  pick: "b",
  purchasing: "u",
  "approve-purchase": "",
  stage: "cb",
  "ship-short": "p",
  people: "",
  settings: "",
  audit: "",
  backup: "",
  "own-account": "cpub",
};

const LETTERS: Record<Exclude<Role, "manager">, string> = {
  clerk: "c",
  planner: "p",
  purchaser: "u",
  builder: "b",
};

describe("permissions", () => {
  const cases = ACTS.flatMap((act) => ROLES.map((role) => ({ act, role })));

  it.each(cases)("$role and $act", ({ act, role }) => {
    const expected = role === "manager" || EXPECTED[act].includes(LETTERS[role]);
    expect(mayDo([role], act)).toBe(expected);
    expect(whoMay(act).includes(role)).toBe(expected);
  });

  it("has a row for every act and no other", () => {
    expect(Object.keys(PERMISSIONS).sort()).toEqual([...ACTS].sort());
  });

  it("adds up several roles and gives nothing to somebody without one", () => {
    expect(mayDo(["clerk", "planner"], "approve-count")).toBe(true);
    expect(mayDo(["clerk", "planner"], "adjust")).toBe(true);
    expect(ACTS.some((act) => mayDo([], act))).toBe(false);
  });
});
