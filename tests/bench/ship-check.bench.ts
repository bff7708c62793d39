import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import { planShip } from "~/domain/planning/plan-ship";
import { bestTime } from "./support/best-time";
import { demoPlan } from "./support/demo-plan";
import { report } from "./support/figure";
import { plainDemand } from "./support/open-pass";

/** The computing of a whole ship check on the demo: both passes, the ladder to ten, dates. */
const { structure, supplies } = demoPlan();
const demand = [plainDemand("S2", 10)];
const check = () => {
  const result = planShip({ structure, supplies, demand, sharing: "strict" });
  if (!result.ok) throw new Error(result.problems[0].code);
  return result.plan;
};
for (let warm = 0; warm < 100; warm++) check();
const plan = check();
report([
  { name: "S2 at 10 kits: whole ship check", value: bestTime(300, check), unit: "ms", target: { most: 2 } },
  {
    name: "S2 at 10 kits: its answer written as JSON",
    value: bestTime(100, () => JSON.stringify(presentShipCheck(plan))),
    unit: "ms",
  },
]);
