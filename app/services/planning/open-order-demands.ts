import type { PlanDemand } from "~/domain/planning/types";
import type { PlanBook } from "./get-plan-book.server";

/**
 * Open kit orders as demands of one kit each, in the order of service, the first so many of them. A
 * wanted date that has passed asks for the kit today.
 */
export function openOrderDemands(
  { kitOrders, day }: Pick<PlanBook, "kitOrders" | "day">,
  most = kitOrders.length,
): PlanDemand[] {
  return kitOrders.slice(0, most).map(({ partNumber, options, serial, wantedOn }) => ({
    partNumber,
    quantity: "1",
    due: wantedOn !== null && wantedOn >= day ? wantedOn : null,
    options,
    serial,
  }));
}
