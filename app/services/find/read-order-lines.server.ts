import { readRows } from "~/db/read-rows.server";
import type { OrderLine } from "~/schemas/find/place-pages";
import { formatDecimals } from "~/utils/format/format-decimals";
import { trimDecimal } from "~/utils/format/trim-decimal";

const LINES = `
  SELECT purchase_order.number, line.line_number AS line, part.part_number AS partNumber, part.description, part.unit,
    part.decimals, line.quantity, line.received, line.due_on AS due, line.unit_price AS unitPrice,
    IF(line.closed OR purchase_order.state IN ('closed', 'cancelled'), 0,
      GREATEST(line.quantity - line.received, 0)) AS open
  FROM purchase_order_line line
  JOIN purchase_order ON purchase_order.id = line.purchase_order_id
  JOIN part ON part.id = line.part_id`;

/** The lines of one purchase order, or those still open with one supplier, soonest first. */
export async function readOrderLines(
  of: { order: number } | { supplier: number },
  seesCosts: boolean,
): Promise<OrderLine[]> {
  const rows =
    "order" in of
      ? await readRows<OrderLine & { decimals: number }>(
          `${LINES} WHERE purchase_order.id = :id ORDER BY line.line_number`,
          { id: of.order },
        )
      : await readRows<OrderLine & { decimals: number }>(
          `${LINES} WHERE purchase_order.supplier_id = :id AND purchase_order.state = 'sent' AND line.closed = FALSE
            AND line.quantity > line.received
          ORDER BY line.due_on IS NULL, line.due_on, purchase_order.number, line.line_number`,
          { id: of.supplier },
        );
  return rows.map(({ decimals, ...row }) => ({
    ...row,
    quantity: formatDecimals(row.quantity, decimals),
    received: formatDecimals(row.received, decimals),
    open: formatDecimals(row.open, decimals),
    unitPrice: seesCosts && row.unitPrice !== null ? trimDecimal(row.unitPrice) : null,
  }));
}
