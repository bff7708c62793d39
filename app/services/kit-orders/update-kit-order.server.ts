import type { Transaction } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { KitOrder } from "~/db/models/orders/kit-order";
import { KitOrderOption } from "~/db/models/orders/kit-order-option";
import { type ChangedKitOrderInput, changedKitOrderSchema } from "~/schemas/kit-orders/kit-order";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { parseInput } from "~/utils/request-body";
import { checkKitOrder } from "./check-kit-order.server";
import { lockKitOrder } from "./lock-kit-order.server";
import { recordKitOrder } from "./record-kit-order.server";

/**
 * Changes an open order; its number stays.
 * @throws AppError `invalid` with errors by field, `conflict` when somebody changed it first, `not-found`, `forbidden`
 */
export async function updateKitOrder(number: string, input: unknown, person: CurrentPerson): Promise<void> {
  assertMay(person, "kit-orders");
  const order = parseInput(changedKitOrderSchema, input);
  await inTransaction((transaction) => update(number, order, person, transaction));
}

async function update(
  number: string,
  order: ChangedKitOrderInput,
  person: CurrentPerson,
  transaction: Transaction,
): Promise<void> {
  const { id, before } = await lockKitOrder(number, order.version, transaction);
  const partId = await checkKitOrder(order, id, transaction);
  const { serial, wantedOn, customer, priority, note } = order;
  await KitOrder.update(
    { partId, serial, wantedOn, customer, priority, note, version: order.version + 1 },
    { where: { id }, transaction },
  );
  await KitOrderOption.destroy({ where: { kitOrderId: id }, transaction });
  for (const optionCode of new Set(order.options)) {
    await KitOrderOption.create({ kitOrderId: id, optionCode }, { transaction });
  }
  await recordKitOrder({ actorId: person.id, number, before, after: { ...order, number } }, transaction);
}
