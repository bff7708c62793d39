import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";

/** A kit order joined with its kit; `optionCodes` as the database joins them, one a line. */
export interface KitOrderRow extends Omit<PresentedKitOrder, "options"> {
  id: number;
  optionCodes: string | null;
}

/** A row without what pages need not know. */
export function presentKitOrder({ id: _id, optionCodes, ...order }: KitOrderRow): PresentedKitOrder {
  return { ...order, options: optionCodes === null ? [] : optionCodes.split("\n") };
}
