import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { Supplies } from "~/domain/planning/compile-supplies";
import { compileSupplies } from "~/domain/planning/compile-supplies";
import type { Structure } from "~/domain/planning/structure/structure";
import type { IsoDate, PlanStock, PlanSupply } from "~/domain/planning/types";
import { trimDecimal } from "~/utils/format/trim-decimal";
import { layOutStock, type ShelfRows } from "./lay-out-stock";

/** Usable stock by lot; what is held, staged or with a supplier is out of reach. */
const STOCK = `
  SELECT part.part_number AS partNumber, SUM(balance.quantity) AS quantity, lot.expires_on AS expiresOn,
    lot.lot_code AS lot
  FROM balance
  JOIN part ON part.id = balance.part_id
  JOIN lot ON lot.id = balance.lot_id
  WHERE balance.state = 'usable'
  GROUP BY part.id, lot.id
  HAVING SUM(balance.quantity) > 0`;

/** Components of unfinished builds: promised ones still lie in their bins, picked ones do not. */
const IN_WORK = `
  SELECT part.part_number AS partNumber, SUM(component.promised) AS promised, SUM(component.picked) AS picked
  FROM shop_order_component component
  JOIN shop_order ON shop_order.id = component.shop_order_id
  JOIN part ON part.id = component.part_id
  WHERE shop_order.state IN ('planned', 'released')
  GROUP BY part.id`;

const ORDERS = `
  SELECT part.part_number AS partNumber, line.quantity - line.received AS quantity, line.due_on AS due,
    purchase_order.number AS reference
  FROM purchase_order_line line
  JOIN purchase_order ON purchase_order.id = line.purchase_order_id
  JOIN part ON part.id = line.part_id
  WHERE purchase_order.state = 'sent' AND line.closed = FALSE AND line.quantity > line.received
  UNION ALL
  SELECT part.part_number, shop_order.quantity - shop_order.finished, shop_order.due_on, shop_order.number
  FROM shop_order
  JOIN part ON part.id = shop_order.part_id
  WHERE shop_order.state = 'released' AND shop_order.quantity > shop_order.finished`;

interface InWork {
  partNumber: string;
  promised: string;
  picked: string;
}

/** The rows that supplies are laid out from, for a what-if to change. */
export interface SupplyRows {
  stock: PlanStock[];
  orders: PlanSupply[];
  shelves: ShelfRows;
}

/** Reads stock and open orders and lays them out for planning on the given day. */
export async function loadSupplies(
  structure: Structure,
  day: IsoDate,
  transaction: Transaction,
): Promise<{ supplies: Supplies; rows: SupplyRows }> {
  const stock = (await readRows<PlanStock>(STOCK, {}, transaction)).map(trimQuantity);
  const inWork = await readRows<InWork>(IN_WORK, {}, transaction);
  const orders = (await readRows<PlanSupply>(ORDERS, {}, transaction)).map(trimQuantity);
  const promised = inWork.map(({ partNumber, promised }) => ({
    partNumber,
    quantity: trimDecimal(promised),
  }));
  const picked = inWork.map(({ partNumber, picked }) => ({ partNumber, quantity: trimDecimal(picked) }));
  const shelves = { usable: stock, promised, picked };
  const rows = { stock: layOutStock(shelves), orders, shelves };
  return { supplies: compileSupplies(structure, rows.stock, rows.orders, day), rows };
}

function trimQuantity<Row extends { quantity: string }>(row: Row): Row {
  return { ...row, quantity: trimDecimal(row.quantity) };
}
