import type { PlannedKitOrder, ShipLineState } from "~/schemas/planning/effects";

/** The ship line in figures: how many of the orders are ready, what stops the first that is not, when all can go. */
export function describeShipLine(orders: readonly PlannedKitOrder[]): ShipLineState {
  const next = orders.find((order) => !order.isReady);
  return {
    ready: orders.filter((order) => order.isReady).length,
    of: orders.length,
    next: next ? { kitOrder: next.kitOrder, partNumber: next.partNumber, stoppers: next.stoppers } : null,
    allBy: orders.at(-1)?.readyOn ?? null,
  };
}
