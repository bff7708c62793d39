import { readRows } from "~/db/read-rows.server";
import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";
import { AppError } from "~/utils/errors";
import { SELECT_KIT_ORDERS } from "./kit-order-columns";
import { type KitOrderRow, presentKitOrder } from "./present-kit-order";

/** @throws AppError `not-found` */
export async function getKitOrder(number: string): Promise<PresentedKitOrder> {
  const [row] = await readRows<KitOrderRow>(`${SELECT_KIT_ORDERS} WHERE o.number = :number`, { number });
  if (row === undefined) {
    throw new AppError("not-found", `There is no kit order ${number}. The list under Pack has them all.`);
  }
  return presentKitOrder(row);
}
