import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { KitOrderInput } from "~/schemas/kit-orders/kit-order";
import { AppError, type FieldError } from "~/utils/errors";
import { findKits } from "./find-kits.server";

/**
 * Checks an order against the book and locks its kit, so that two orders cannot take one serial at once.
 * @param exceptId the order being changed, whose own serial is no conflict
 * @returns the id of the kit's part
 * @throws AppError `invalid` with errors by field
 */
export async function checkKitOrder(
  order: KitOrderInput,
  exceptId: number | null,
  transaction: Transaction,
): Promise<number> {
  const key = partKey(order.kit);
  const kit = (await findKits(transaction)).find((one) => partKey(one.partNumber) === key);
  if (kit === undefined) {
    throw refusal([
      { field: "kit", message: `${order.kit} is no kit that can be ordered. Choose one of the list.` },
    ]);
  }
  const [part] = await readRows<{ id: number }>(
    "SELECT id FROM part WHERE part_key = :key FOR UPDATE",
    { key },
    transaction,
  );
  const offered = kit.options.map((option) => option.code);
  const errors: FieldError[] = order.options
    .filter((code) => !offered.includes(code))
    .map((code) => ({ field: "options", message: `${kit.partNumber} has no option ${code}.` }));
  const taker =
    order.serial === null ? null : await serialTaker(part.id, order.serial, exceptId, transaction);
  if (taker !== null) {
    errors.push({
      field: "serial",
      message: `${kit.partNumber} with this serial is order ${taker} already.`,
    });
  }
  if (errors.length > 0) throw refusal(errors);
  return part.id;
}

async function serialTaker(
  partId: number,
  serial: string,
  exceptId: number | null,
  transaction: Transaction,
): Promise<string | null> {
  const [taken] = await readRows<{ number: string }>(
    `SELECT number FROM kit_order
     WHERE part_id = :partId AND serial = :serial AND state <> 'cancelled' AND id <> :exceptId LIMIT 1`,
    { partId, serial, exceptId: exceptId ?? 0 },
    transaction,
  );
  return taken?.number ?? null;
}

function refusal(errors: FieldError[]): AppError {
  return new AppError("invalid", errors.map((error) => error.message).join(" "), { errors });
}
