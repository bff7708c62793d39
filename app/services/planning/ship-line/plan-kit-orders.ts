import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import type { Rung } from "~/domain/planning/types";
import { formatSteps } from "~/domain/quantity/format-steps";
import { requireSteps } from "~/domain/quantity/parse-steps";
import { subtractSteps } from "~/domain/quantity/steps";
import type { PlannedKitOrder } from "~/schemas/planning/effects";
import type { PlanBook } from "../get-plan-book.server";
import { openOrderDemands } from "../open-order-demands";
import { planDemand } from "../plan-demand.server";

/** What the open kit orders are planned from. */
export type LineBook = Pick<PlanBook, "structure" | "supplies" | "kitOrders" | "day">;

/**
 * The first so many open kit orders, one kit each, as they are served: whether each is ready, else what it
 * waits for. Orders further down change nothing for those before them. Throws 422 for an order that cannot
 * be planned.
 */
export function planKitOrders(book: LineBook, most: number): PlannedKitOrder[] {
  const orders = book.kitOrders.slice(0, most);
  if (orders.length === 0) return [];
  const plan = planDemand(book, openOrderDemands(book, orders.length), "strict");
  const { demand, ladder } = presentShipCheck(plan);
  return orders.map(({ number }, at) => ({
    kitOrder: number,
    partNumber: demand[at].partNumber,
    isReady: demand[at].buildable !== 0,
    stoppers: addedStoppers(book.structure, ladder[at], ladder[at - 1]),
    readyOn: ladder[at].readyOn,
  }));
}

/** A rung counts from the first kit on: what an order itself lacks is what its rung has more than the one before. */
function addedStoppers(structure: Structure, rung: Rung, before: Rung | undefined): Rung["stoppers"] {
  const earlier = new Map(before?.stoppers.map(({ partNumber, missing }) => [partNumber, missing]));
  return rung.stoppers.flatMap(({ partNumber, missing }) => {
    const decimals = structure.decimals[structure.numberOf.get(partKey(partNumber)) ?? 0];
    const steps = (text: string) => requireSteps(text, decimals);
    const own = subtractSteps(steps(missing), steps(earlier.get(partNumber) ?? "0"));
    return own > 0 ? [{ partNumber, missing: formatSteps(own, decimals) }] : [];
  });
}
