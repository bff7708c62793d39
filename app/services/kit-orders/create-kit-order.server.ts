import { type Transaction, UniqueConstraintError } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { KitOrder } from "~/db/models/orders/kit-order";
import { KitOrderOption } from "~/db/models/orders/kit-order-option";
import { type KitOrderInput, kitOrderSchema } from "~/schemas/kit-orders/kit-order";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { AppError } from "~/utils/errors";
import { parseInput } from "~/utils/request-body";
import { checkKitOrder } from "./check-kit-order.server";
import { nextKitOrderNumber } from "./next-kit-order-number.server";
import { recordKitOrder } from "./record-kit-order.server";

const MOST_TRIES = 5;

/**
 * Enters an order of one kit.
 * @returns its number, given here (KO-0001 and on) unless the input has one
 * @throws AppError `invalid` with errors by field, `forbidden`
 */
export async function createKitOrder(input: unknown, person: CurrentPerson): Promise<string> {
  assertMay(person, "kit-orders");
  const order = parseInput(kitOrderSchema, input);
  for (let tries = 1; ; tries++) {
    try {
      return await inTransaction((transaction) => insert(order, person, transaction));
    } catch (error) {
      if (!(error instanceof UniqueConstraintError)) throw error;
      // A number given here may have been given to another order at the same moment: the next try finds the next one.
      if (order.number !== null || tries === MOST_TRIES) throw numberTaken(order.number);
    }
  }
}

async function insert(
  order: KitOrderInput,
  person: CurrentPerson,
  transaction: Transaction,
): Promise<string> {
  const partId = await checkKitOrder(order, null, transaction);
  const { options, kit: _kit, ...columns } = order;
  const number = order.number ?? (await nextKitOrderNumber(transaction));
  const { id } = await KitOrder.create({ ...columns, number, partId }, { transaction });
  for (const optionCode of new Set(options)) {
    await KitOrderOption.create({ kitOrderId: id, optionCode }, { transaction });
  }
  await recordKitOrder({ actorId: person.id, number, after: { ...order, number } }, transaction);
  return number;
}

function numberTaken(number: string | null): AppError {
  const message =
    number === null
      ? "No number was free. Try again."
      : `${number} is an order already. Choose another number.`;
  return new AppError("invalid", message, { errors: [{ field: "number", message }] });
}
