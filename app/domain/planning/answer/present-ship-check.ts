import { formatSteps } from "../../quantity/format-steps";
import { type Steps, subtractSteps } from "../../quantity/steps";
import { isoDate } from "../dates/day-number";
import { NEVER } from "../dates/need-dates";
import type { Amounts } from "../netting/pass-state";
import type { ShipPlan } from "../plan-ship";
import { MAKE } from "../structure/structure";
import type { Debt, IsoDate, Rung, ShipCheck, Shortage } from "../types";
import { findWarnings } from "./find-warnings";
import { sortWorstFirst } from "./sort-worst-first";
import { sumCost } from "./sum-cost";

/** The plan as the contracts of command line and HTTP give it (DESIGN.md; PLANNING.md, sections 4 and 5). */
export function presentShipCheck(plan: ShipPlan): ShipCheck {
  const { supplies, demand, buildable, earliest, served } = plan;
  return {
    today: isoDate(supplies.today),
    demand: demand.map((one, at) => ({
      partNumber: partNumberOf(plan, at),
      quantity: one.quantity,
      due: one.due,
      options: [...one.options],
      serial: one.serial,
      buildable: asNumber(buildable[at]),
      earliest: isoDate(earliest[at]),
    })),
    ...totalsByKit(plan),
    ladder: presentLadder(plan),
    shortages: presentShortages(plan),
    builds: presentBuilds(plan),
    criticalChain: served.chain,
    ...(plan.debts ? { debts: presentDebts(plan) } : {}),
    warnings: findWarnings(plan),
  };
}

function partNumberOf(plan: ShipPlan, demand: number): string {
  const segment = plan.segments.find((one) => one.demand === demand);
  return plan.structure.parts[segment?.part ?? 0].partNumber;
}

function asNumber(count: Steps | null): number | null {
  return count === null ? null : Number(count);
}

/** For each kit the sum of its demands' kits and the latest of their dates. */
function totalsByKit(plan: ShipPlan): Pick<ShipCheck, "buildable" | "earliest"> {
  const counts = new Map<string, number | null>();
  const days = new Map<string, IsoDate>();
  plan.demand.forEach((_, at) => {
    const kit = partNumberOf(plan, at);
    const own = asNumber(plan.buildable[at]);
    const sum = counts.get(kit) ?? 0;
    counts.set(kit, own === null || (counts.has(kit) && counts.get(kit) === null) ? null : sum + own);
    const day = isoDate(plan.earliest[at]);
    if (day > (days.get(kit) ?? "")) days.set(kit, day);
  });
  return { buildable: Object.fromEntries(counts), earliest: Object.fromEntries(days) };
}

function presentLadder({ structure, served }: ShipPlan): Rung[] {
  return served.rungs.map((rung) => ({
    partNumber: structure.parts[rung.part].partNumber,
    kits: rung.kits,
    cost: sumCost(structure, rung.short),
    readyOn: isoDate(rung.readyOn),
    stoppers: sortWorstFirst(structure, rung.stoppers).map(({ part, missing }) => ({
      partNumber: structure.parts[part].partNumber,
      missing: formatSteps(missing, structure.decimals[part]),
    })),
  }));
}

function presentShortages(plan: ShipPlan): Shortage[] {
  const { structure, served } = plan;
  const { before, now, coming, ready, stopsAt, needs } = served;
  const shortages: Shortage[] = [];
  for (const [part, first] of stopsAt) {
    const say = (after: Amounts, earlier: Amounts) =>
      formatSteps(subtractSteps(after[part], earlier[part]), structure.decimals[part]);
    shortages.push({
      partNumber: structure.parts[part].partNumber,
      unit: structure.parts[part].unit,
      gross: say(coming.gross, before.coming.gross),
      fromStock: say(coming.fromStock, before.coming.fromStock),
      onOrder: say(coming.onOrder, before.coming.onOrder),
      short: say(coming.net, before.coming.net),
      missing: say(now.net, before.now.net),
      stopsAt: Number(first),
      needBy: dateOrNull(needs.needBy[part]),
      orderBy: dateOrNull(needs.orderBy[part]),
      readyOn: isoDate(ready[part]),
    });
  }
  return shortages.sort(byPartNumber);
}

function dateOrNull(day: number): IsoDate | null {
  return day === NEVER ? null : isoDate(day);
}

function presentBuilds({ structure, served }: ShipPlan): ShipCheck["builds"] {
  const { coming, before } = served;
  const builds: ShipCheck["builds"] = [];
  for (let p = 0; p < structure.parts.length; p++) {
    if (structure.sourcing[p] !== MAKE || structure.leaf[p]) continue;
    if (!(coming.start[p] > before.coming.start[p])) continue;
    const say = (after: Amounts, earlier: Amounts) =>
      formatSteps(subtractSteps(after[p], earlier[p]), structure.decimals[p]);
    builds.push({
      partNumber: structure.parts[p].partNumber,
      unit: structure.parts[p].unit,
      gross: say(coming.gross, before.coming.gross),
      fromStock: say(coming.fromStock, before.coming.fromStock),
      onOrder: say(coming.onOrder, before.coming.onOrder),
      build: say(coming.start, before.coming.start),
    });
  }
  return builds.sort(byPartNumber);
}

function presentDebts({ structure, debts }: ShipPlan): Debt[] {
  return (debts ?? []).map(({ part, quantity, from, to }) => ({
    partNumber: structure.parts[part].partNumber,
    quantity: formatSteps(quantity, structure.decimals[part]),
    from: from + 1,
    to: to + 1,
  }));
}

/** Binary order; JavaScript compares UTF-16 units, which differs only past the basic plane. */
function byPartNumber(a: { partNumber: string }, b: { partNumber: string }): number {
  return a.partNumber < b.partNumber ? -1 : a.partNumber > b.partNumber ? 1 : 0;
}
