import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { IsoDate } from "~/domain/planning/types";

/** An open kit order as the plan serves it: one kit. */
export interface OpenKitOrder {
  number: string;
  partNumber: string;
  customer: string;
  options: string[];
  serial: string | null;
  wantedOn: IsoDate | null;
  /** 1 is served first. */
  priority: number;
}

const OPEN_ORDERS = `
  SELECT kit_order.number, part.part_number AS partNumber, kit_order.customer, kit_order.serial,
    kit_order.wanted_on AS wantedOn, kit_order.priority,
    (SELECT GROUP_CONCAT(chosen.option_code ORDER BY chosen.option_code SEPARATOR '\n')
      FROM kit_order_option chosen WHERE chosen.kit_order_id = kit_order.id) AS options
  FROM kit_order
  JOIN part ON part.id = kit_order.part_id
  WHERE kit_order.state = 'open'
  ORDER BY kit_order.priority, kit_order.wanted_on IS NULL, kit_order.wanted_on, kit_order.number`;

/** Every open kit order in the order of service: priority, wanted date, number (PLANNING.md, section 4). */
export async function loadKitOrders(transaction: Transaction): Promise<OpenKitOrder[]> {
  const rows = await readRows<Omit<OpenKitOrder, "options"> & { options: string | null }>(
    OPEN_ORDERS,
    {},
    transaction,
  );
  return rows.map((row) => ({ ...row, options: row.options === null ? [] : row.options.split("\n") }));
}
