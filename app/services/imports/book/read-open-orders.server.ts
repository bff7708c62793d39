import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { trimDecimal } from "~/utils/format/trim-decimal";

/** A purchase order line or a shop order, with what is still to come of it. */
export interface OpenOrder {
  id: number;
  number: string;
  partId: number;
  quantity: string;
  due: string | null;
  state: string;
}

export interface OpenOrders {
  /** In the order of their lines. */
  purchase: OpenOrder[];
  /** State by number, also of orders without lines. */
  purchaseStates: Map<string, string>;
  shop: Map<string, OpenOrder>;
}

function trim(order: OpenOrder): OpenOrder {
  return { ...order, quantity: trimDecimal(order.quantity) };
}

/** Reads every purchase order line and shop order. */
export async function readOpenOrders(transaction: Transaction): Promise<OpenOrders> {
  const purchase = await readRows<OpenOrder>(
    `SELECT line.id, number, part_id AS partId, due_on AS due, state,
      IF(closed, 0, GREATEST(quantity - received, 0)) AS quantity
     FROM purchase_order_line line JOIN purchase_order ON purchase_order.id = line.purchase_order_id
     ORDER BY line.purchase_order_id, line_number`,
    {},
    transaction,
  );
  const orders = await readRows<{ number: string; state: string }>(
    "SELECT number, state FROM purchase_order",
    {},
    transaction,
  );
  const shop = await readRows<OpenOrder>(
    `SELECT id, number, part_id AS partId, due_on AS due, state, GREATEST(quantity - finished, 0) AS quantity
     FROM shop_order`,
    {},
    transaction,
  );
  return {
    purchase: purchase.map(trim),
    purchaseStates: new Map(orders.map(({ number, state }) => [number, state])),
    shop: new Map(shop.map((order) => [order.number, trim(order)])),
  };
}
