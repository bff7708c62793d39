import type { Segment } from "../netting/split-demand";
import type { ShipPlan } from "../plan-ship";
import { BUY } from "../structure/structure";
import type { ShipCheck, WarningCode } from "../types";

/** What the answer cannot say in numbers, sorted by part number, then code. */
export function findWarnings(plan: ShipPlan): ShipCheck["warnings"] {
  const found = new Map<string, { code: WarningCode; partNumber: string }>();
  const add = (code: WarningCode, part: number) => {
    const { partNumber } = plan.structure.parts[part];
    found.set(`${partNumber}\n${code}`, { code, partNumber });
  };
  addAsRequired(plan, add);
  addStructureless(plan, add);
  addUncertainOrders(plan, add);
  return [...found.keys()].sort().map((key) => found.get(key) as { code: WarningCode; partNumber: string });
}

type Add = (code: WarningCode, part: number) => void;

/** Lines without quantity of parts that are started, where no lot is usable for the kits asked for. */
function addAsRequired({ structure, supplies, served, segments }: ShipPlan, add: Add): void {
  const { starts, component, source } = structure.asRequired;
  for (let p = 0; p < structure.parts.length; p++) {
    if (starts[p] === starts[p + 1]) continue;
    if (!(served.now.start[p] > 0) && !(served.all.start[p] > 0)) continue;
    for (let k = starts[p]; k < starts[p + 1]; k++) {
      const part = component[k];
      const uses = (segment: Segment) => segment.admits(structure.lines[source[k]]);
      const lacks = (segment: Segment) => !hasUsable(supplies.stockNow, part, segment.due ?? supplies.today);
      if (segments.some((segment) => uses(segment) && lacks(segment))) add("as-required-none-on-hand", part);
    }
  }
}

function hasUsable(
  { totals, buckets }: ShipPlan["supplies"]["stockNow"],
  part: number,
  day: number,
): boolean {
  const lots = buckets.get(part);
  if (!lots) return totals[part] > 0;
  return lots.some((lot) => lot.day >= day && lot.quantity > 0);
}

function addStructureless({ structure, served }: ShipPlan, add: Add): void {
  for (let p = 0; p < structure.parts.length; p++) {
    if (!structure.leaf[p] || structure.sourcing[p] === BUY) continue;
    if (served.now.net[p] > 0 || served.coming.net[p] > 0) add("make-without-structure", p);
  }
}

/** Orders that the dates rest on though nobody has said when they come. */
function addUncertainOrders({ supplies, served }: ShipPlan, add: Add): void {
  for (const [part, orders] of supplies.orders.buckets) {
    let before = 0n;
    for (const order of orders) {
      if (served.all.onOrder[part] > before) {
        if (order.flag === "overdue") add("overdue-supply", part);
        if (order.flag === "undated") add("supply-without-date", part);
      }
      before += BigInt(order.quantity);
    }
  }
}
