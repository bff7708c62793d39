import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { OpenOrder, PartAnswer, PartBalance } from "~/schemas/parts/part-answer";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { today } from "~/utils/clock";
import { AppError } from "~/utils/errors";
import { formatDecimals } from "~/utils/format/format-decimals";
import { getWhereUsed } from "./get-where-used.server";
import { PART_COLUMNS, type PartRow, presentPart } from "./present-part";
import { standingOf, sumPartStock } from "./sum-part-stock";

const BALANCES = `
  SELECT bin.code AS bin, NULLIF(lot.lot_code, '') AS lot, balance.state, balance.quantity, lot.expires_on AS expiresOn
  FROM balance JOIN bin ON bin.id = balance.bin_id JOIN lot ON lot.id = balance.lot_id
  WHERE balance.part_id = :id AND balance.quantity <> 0
  ORDER BY bin.walk_order, bin.bin_key, lot.lot_code, balance.state`;

const ON_ORDER = `
  SELECT 'purchase-order' AS kind, purchase_order.number AS reference, line.quantity - line.received AS quantity, line.due_on AS due,
    supplier.name AS supplier
  FROM purchase_order_line line
  JOIN purchase_order ON purchase_order.id = line.purchase_order_id
  LEFT JOIN supplier ON supplier.id = purchase_order.supplier_id
  WHERE line.part_id = :id AND purchase_order.state = 'sent' AND line.closed = FALSE AND line.quantity > line.received
  UNION ALL
  SELECT 'shop-order', number, quantity - finished, due_on, NULL FROM shop_order
  WHERE part_id = :id AND state = 'released' AND quantity > finished
  ORDER BY due IS NULL, due, reference`;

const PROMISED = `
  SELECT shop_order.number AS reference, component.promised AS quantity
  FROM shop_order_component component JOIN shop_order ON shop_order.id = component.shop_order_id
  WHERE component.part_id = :id AND component.promised > 0 AND shop_order.state IN ('planned', 'released')
  ORDER BY shop_order.due_on, shop_order.number`;

/** One part with balances by bin, lot and state, what is promised and on order, and where it is used. */
export async function getPart(partNumber: string, person: CurrentPerson): Promise<PartAnswer> {
  const row = await findPartRow(partNumber);
  const say = <Row extends { quantity: string }>(one: Row) => ({
    ...one,
    quantity: formatDecimals(one.quantity, row.decimals),
  });
  const named = { id: row.id };
  const day = today();
  const balances = (await readRows<Omit<PartBalance, "standing">>(BALANCES, named)).map((balance) => ({
    ...say(balance),
    standing: standingOf(balance.state, balance.expiresOn, day),
  }));
  const promised = (await readRows<PartAnswer["promised"][number]>(PROMISED, named)).map(say);
  const onOrder = (await readRows<Omit<OpenOrder, "isOverdue">>(ON_ORDER, named)).map((order) => ({
    ...say(order),
    isOverdue: order.due !== null && order.due < day,
  }));
  return {
    ...presentPart(row, mayDo(person.roles, "see-costs")),
    totals: sumPartStock({ balances, promised, onOrder }, row.decimals),
    balances,
    promised,
    onOrder,
    whereUsed: (await getWhereUsed(partNumber)).parents,
  };
}

async function findPartRow(partNumber: string): Promise<PartRow> {
  const [row] = await readRows<PartRow>(`SELECT ${PART_COLUMNS} FROM part WHERE part.part_key = :key`, {
    key: partKey(partNumber),
  });
  if (!row)
    throw new AppError(
      "not-found",
      `There is no part ${partNumber} in the book. Check the number or search for it.`,
    );
  return row;
}
