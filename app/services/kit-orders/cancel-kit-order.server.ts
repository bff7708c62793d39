import { inTransaction } from "~/db/in-transaction.server";
import { KitOrder } from "~/db/models/orders/kit-order";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { lockKitOrder } from "./lock-kit-order.server";
import { recordKitOrder } from "./record-kit-order.server";

/**
 * Cancels an open order: it leaves the ship line and stays in the list of closed ones.
 * @param version the one the person had before them
 * @throws AppError `conflict` when somebody changed it first or it is no longer open, `not-found`, `forbidden`
 */
export async function cancelKitOrder(number: string, version: number, person: CurrentPerson): Promise<void> {
  assertMay(person, "kit-orders");
  await inTransaction(async (transaction) => {
    const { id, before } = await lockKitOrder(number, version, transaction);
    await KitOrder.update({ state: "cancelled", version: version + 1 }, { where: { id }, transaction });
    await recordKitOrder(
      { actorId: person.id, number, before, after: { ...before, state: "cancelled" } },
      transaction,
    );
  });
}
