import { kitOrdersKind } from "~/schemas/imports/kit-orders";
import { offersKind } from "~/schemas/imports/offers";
import { suppliersKind } from "~/schemas/imports/suppliers";
import { supplyKind } from "~/schemas/imports/supply";
import { columnsOf } from "~/services/exports/columns-of";
import type { ExportTable } from "~/services/exports/export-table";
import { readWhole } from "~/services/exports/read-whole.server";

export const suppliersTable: ExportTable = {
  name: "suppliers",
  act: "look",
  columns: columnsOf(suppliersKind),
  read: readWhole(
    "SELECT code AS supplier, name, email, phone, currency, lead_time_days, note FROM supplier ORDER BY supplier_key",
  ),
};

export const offersTable: ExportTable = {
  name: "offers",
  act: "see-costs",
  columns: columnsOf(offersKind),
  read: readWhole(
    `SELECT supplier.code AS supplier, part.part_number, supplier_part_number, buying_unit, per_buying_unit, minimum,
      multiple, from_quantity, unit_price, offer.currency, offer.lead_time_days, preferred
     FROM offer JOIN supplier ON supplier.id = offer.supplier_id JOIN part ON part.id = offer.part_id
     ORDER BY supplier.supplier_key, part.part_key, from_quantity`,
    ["per_buying_unit", "minimum", "multiple", "from_quantity", "unit_price"],
  ),
};

/** What is still to come on purchase orders and shop orders. */
export const supplyTable: ExportTable = {
  name: "supply",
  act: "look",
  columns: columnsOf(supplyKind),
  read: readWhole(
    `SELECT part_number, quantity, due, reference FROM (
       SELECT part.part_number, part.part_key, line.quantity - line.received AS quantity, line.due_on AS due,
        orders.number AS reference, line.line_number AS place
       FROM purchase_order_line line JOIN purchase_order orders ON orders.id = line.purchase_order_id
        JOIN part ON part.id = line.part_id
       WHERE orders.state = 'sent' AND NOT line.closed AND line.quantity > line.received
       UNION ALL
       SELECT part.part_number, part.part_key, shop_order.quantity - finished, due_on, number, 1
       FROM shop_order JOIN part ON part.id = shop_order.part_id
       WHERE state = 'released' AND quantity > finished) AS coming
     ORDER BY reference, place, part_key`,
    ["quantity"],
  ),
};

export const kitOrdersTable: ExportTable = {
  name: "kit-orders",
  act: "look",
  columns: columnsOf(kitOrdersKind),
  read: readWhole(
    `SELECT number, part.part_number AS kit, customer, serial, wanted_on, priority,
      (SELECT GROUP_CONCAT(option_code ORDER BY option_code SEPARATOR '+') FROM kit_order_option
        WHERE kit_order_id = kit_order.id) AS options, note
     FROM kit_order JOIN part ON part.id = kit_order.part_id
     WHERE state = 'open' ORDER BY number`,
  ),
};
