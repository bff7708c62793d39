import { presentShipCheck } from "./answer/present-ship-check";
import { compileSupplies } from "./compile-supplies";
import { planShip } from "./plan-ship";
import type { Structure } from "./structure/structure";
import type { DemandProblem, IsoDate, PlanDemand, PlanStock, PlanSupply, Sharing, ShipCheck } from "./types";

export interface CheckShipInput {
  structure: Structure;
  stock: readonly PlanStock[];
  supply: readonly PlanSupply[];
  demand: readonly PlanDemand[];
  sharing: Sharing;
  today: IsoDate;
}

export type CheckShipResult = { ok: true; answer: ShipCheck } | { ok: false; problems: DemandProblem[] };

/** Can these kits ship, what stops the rest, and when? From rows to the answer in one call. */
export function checkShip({
  structure,
  stock,
  supply,
  demand,
  sharing,
  today,
}: CheckShipInput): CheckShipResult {
  const supplies = compileSupplies(structure, stock, supply, today);
  const result = planShip({ structure, supplies, demand, sharing });
  return result.ok ? { ok: true, answer: presentShipCheck(result.plan) } : result;
}
