import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { getPlanBook } from "./get-plan-book.server";
import { describeShipLine } from "./ship-line/describe-ship-line";
import { kitsShown } from "./ship-line/kits-shown.server";
import { presentKitOrders } from "./ship-line/present-kit-orders";

/** The next open kit orders in priority order, one kit each: how many are ready, and what stops the first that is not. */
export async function getShipLine(): Promise<ShipLineAnswer> {
  const [book, shown] = await Promise.all([getPlanBook(), kitsShown()]);
  return { ...describeShipLine(presentKitOrders(book, shown)), revision: book.revision };
}
