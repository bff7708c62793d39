import { readRows } from "~/db/read-rows.server";
import type { PurchaseOrderPage } from "~/schemas/find/place-pages";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { today } from "~/utils/clock";
import { AppError } from "~/utils/errors";
import { readOrderLines } from "./read-order-lines.server";

type OrderRow = Omit<PurchaseOrderPage, "lines" | "seesCosts" | "today"> & { id: number };

/** A purchase order and its lines. Throws 404 where there is no such order. */
export async function getPurchaseOrderPage(
  number: string,
  person: CurrentPerson,
): Promise<PurchaseOrderPage> {
  const [order] = await readRows<OrderRow>(
    `SELECT purchase_order.id, purchase_order.number, purchase_order.state, supplier.code AS supplier,
      supplier.name AS supplierName, purchase_order.ordered_on AS orderedOn, purchase_order.note
    FROM purchase_order LEFT JOIN supplier ON supplier.id = purchase_order.supplier_id
    WHERE purchase_order.number = :number`,
    { number },
  );
  if (!order)
    throw new AppError(
      "not-found",
      `There is no purchase order ${number}. Check the number or search for it.`,
    );
  const { id, ...named } = order;
  const seesCosts = mayDo(person.roles, "see-costs");
  return { ...named, lines: await readOrderLines({ order: id }, seesCosts), seesCosts, today: today() };
}
