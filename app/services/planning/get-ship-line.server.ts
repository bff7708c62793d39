import { readRows } from "~/db/read-rows.server";
import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import type { ShipCheck } from "~/domain/planning/types";
import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { getPlanBook } from "./get-plan-book.server";
import type { OpenKitOrder } from "./load-kit-orders.server";
import { openOrderDemands } from "./open-order-demands";
import { planDemand } from "./plan-demand.server";

const KITS_SHOWN = 10;

/** The next open kit orders in priority order, one kit each: how many are ready, and what stops the first that is not. */
export async function getShipLine(): Promise<ShipLineAnswer> {
  const book = await getPlanBook();
  const orders = book.kitOrders.slice(0, await kitsShown());
  if (orders.length === 0) return { ready: 0, of: 0, next: null, allBy: null, revision: book.revision };
  const demands = openOrderDemands(book, orders.length);
  const answer = presentShipCheck(planDemand(book, demands, "strict"));
  const waiting = answer.demand.findIndex((one) => one.buildable === 0);
  return {
    ready: answer.demand.filter((one) => one.buildable !== 0).length,
    of: orders.length,
    next: waiting < 0 ? null : nextToWait(orders, answer, waiting),
    allBy: answer.ladder[answer.ladder.length - 1].readyOn,
    revision: book.revision,
  };
}

/** The orders before the first that waits lack nothing, so all that its rung lacks is its own. */
function nextToWait(orders: OpenKitOrder[], answer: ShipCheck, waiting: number): ShipLineAnswer["next"] {
  const { number, partNumber } = orders[waiting];
  return { kitOrder: number, partNumber, stoppers: answer.ladder[waiting].stoppers };
}

async function kitsShown(): Promise<number> {
  const [setting] = await readRows<{ value: unknown }>(
    "SELECT value FROM setting WHERE name = 'ship-line-kits'",
  );
  const count = Number(setting?.value ?? KITS_SHOWN);
  return Number.isInteger(count) && count > 0 ? count : KITS_SHOWN;
}
