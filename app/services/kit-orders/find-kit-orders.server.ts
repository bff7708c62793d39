import { readRows } from "~/db/read-rows.server";
import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";
import { SELECT_KIT_ORDERS } from "./kit-order-columns";
import { type KitOrderRow, presentKitOrder } from "./present-kit-order";

const MOST_CLOSED = 50;

/** Open orders in the order in which they are served (priority, wanted date, number), and the last closed ones. */
export async function findKitOrders(): Promise<{ open: PresentedKitOrder[]; closed: PresentedKitOrder[] }> {
  const [open, closed] = await Promise.all([
    readRows<KitOrderRow>(
      `${SELECT_KIT_ORDERS} WHERE o.state = 'open' ORDER BY o.priority, o.wanted_on IS NULL, o.wanted_on, o.number`,
    ),
    readRows<KitOrderRow>(`${SELECT_KIT_ORDERS} WHERE o.state <> 'open' ORDER BY o.id DESC LIMIT :most`, {
      most: MOST_CLOSED,
    }),
  ]);
  return { open: open.map(presentKitOrder), closed: closed.map(presentKitOrder) };
}
