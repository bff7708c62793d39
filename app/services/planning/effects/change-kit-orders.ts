import type { BookChange } from "~/schemas/planning/effects";
import type { OpenKitOrder } from "../load-kit-orders.server";
import { refuseChange } from "./refuse-change";

/** An order without a wanted date stands after those that have one. */
const AFTER_ALL_DAYS = "9999-12-31";

/**
 * The open kit orders as they would be, in the order of service: priority, wanted date, number.
 * @param nextNumber what an order entered without a number gets
 */
export function changeKitOrders(
  orders: readonly OpenKitOrder[],
  { add, change, cancel }: BookChange["kitOrders"],
  nextNumber: string,
): OpenKitOrder[] {
  const byNumber = new Map(orders.map((order) => [order.number, order]));
  cancel.forEach((number, at) => {
    if (!byNumber.delete(number)) throw notOpen(`kitOrders.cancel.${at}`, number);
  });
  change.forEach(({ number, kit, ...patch }, at) => {
    const order = byNumber.get(number);
    if (order === undefined) throw notOpen(`kitOrders.change.${at}`, number);
    const given = Object.entries(patch).filter(([, value]) => value !== undefined);
    byNumber.set(number, { ...order, ...Object.fromEntries(given), ...(kit && { partNumber: kit }) });
  });
  add.forEach(({ number, kit, ...order }, at) => {
    const given = number ?? nextNumber;
    if (byNumber.has(given)) {
      const message = `${given} is an order already. Choose another number.`;
      throw refuseChange(`kitOrders.add.${at}.number`, given, message);
    }
    byNumber.set(given, { ...order, number: given, partNumber: kit, customer: "" });
  });
  return [...byNumber.values()].sort(inOrderOfService);
}

function notOpen(place: string, number: string) {
  return refuseChange(place, number, `${number} is no open kit order. Load the page again.`);
}

function inOrderOfService(a: OpenKitOrder, b: OpenKitOrder): number {
  if (a.priority !== b.priority) return a.priority - b.priority;
  const [left, right] = [a.wantedOn ?? AFTER_ALL_DAYS, b.wantedOn ?? AFTER_ALL_DAYS];
  if (left !== right) return left < right ? -1 : 1;
  return a.number < b.number ? -1 : 1;
}
