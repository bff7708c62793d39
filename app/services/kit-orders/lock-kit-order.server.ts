import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { PresentedKitOrder } from "~/schemas/kit-orders/presented-kit-order";
import { AppError } from "~/utils/errors";
import { SELECT_KIT_ORDERS } from "./kit-order-columns";
import { type KitOrderRow, presentKitOrder } from "./present-kit-order";

/**
 * Locks an open order that is still as the person saw it.
 * @throws AppError `not-found`, or `conflict` when it has changed since or is no longer open
 */
export async function lockKitOrder(
  number: string,
  version: number,
  transaction: Transaction,
): Promise<{ id: number; before: PresentedKitOrder }> {
  const [row] = await readRows<KitOrderRow>(
    `${SELECT_KIT_ORDERS} WHERE o.number = :number FOR UPDATE`,
    { number },
    transaction,
  );
  if (row === undefined) throw new AppError("not-found", `There is no kit order ${number}.`);
  if (row.state !== "open") {
    throw new AppError("conflict", `${number} is ${row.state} by now, so it can no longer be changed.`);
  }
  if (row.version !== version) {
    throw new AppError(
      "conflict",
      `Somebody changed ${number} while you had it open. Nothing of yours was saved: load it again to see their change, then enter yours.`,
    );
  }
  return { id: row.id, before: presentKitOrder(row) };
}
