import { readRows } from "~/db/read-rows.server";
import type { ShopOrderComponent, ShopOrderPage } from "~/schemas/find/place-pages";
import { today } from "~/utils/clock";
import { AppError } from "~/utils/errors";
import { formatDecimals } from "~/utils/format/format-decimals";

type OrderRow = Omit<ShopOrderPage, "components" | "today"> & { id: number; decimals: number };

const COMPONENTS = `
  SELECT part.part_number AS partNumber, part.description, part.unit, part.decimals, component.promised, component.picked
  FROM shop_order_component component JOIN part ON part.id = component.part_id
  WHERE component.shop_order_id = :id
  ORDER BY part.part_key`;

/** A shop order and what is promised to it. Throws 404 where there is no such order. */
export async function getShopOrderPage(number: string): Promise<ShopOrderPage> {
  const [order] = await readRows<OrderRow>(
    `SELECT shop_order.id, shop_order.number, shop_order.state, part.part_number AS partNumber, part.description,
      part.unit, part.decimals, shop_order.quantity, shop_order.finished, shop_order.due_on AS due
    FROM shop_order JOIN part ON part.id = shop_order.part_id
    WHERE shop_order.number = :number`,
    { number },
  );
  if (!order)
    throw new AppError("not-found", `There is no shop order ${number}. Check the number or search for it.`);
  const { id, decimals, ...named } = order;
  const components = await readRows<ShopOrderComponent & { decimals: number }>(COMPONENTS, { id });
  return {
    ...named,
    quantity: formatDecimals(named.quantity, decimals),
    finished: formatDecimals(named.finished, decimals),
    components: components.map(({ decimals: own, ...component }) => ({
      ...component,
      promised: formatDecimals(component.promised, own),
      picked: formatDecimals(component.picked, own),
    })),
    today: today(),
  };
}
