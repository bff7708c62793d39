import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { AppError } from "~/utils/errors";
import { formatDecimals } from "~/utils/format/format-decimals";
import { getWhereUsed, type WhereUsedLine } from "./get-where-used.server";
import { PART_COLUMNS, type PartRow, type PresentedPart, presentPart } from "./present-part";

export interface PartBalance {
  bin: string;
  lot: string | null;
  state: string;
  quantity: string;
  expiresOn: string | null;
}

interface OpenOrder {
  reference: string;
  quantity: string;
  due: string | null;
  supplier: string | null;
}

export interface PartAnswer extends PresentedPart {
  balances: PartBalance[];
  /** Promised to builds under way. */
  promised: { reference: string; quantity: string }[];
  onOrder: OpenOrder[];
  whereUsed: WhereUsedLine[];
}

const BALANCES = `
  SELECT bin.code AS bin, NULLIF(lot.lot_code, '') AS lot, balance.state, balance.quantity, lot.expires_on AS expiresOn
  FROM balance JOIN bin ON bin.id = balance.bin_id JOIN lot ON lot.id = balance.lot_id
  WHERE balance.part_id = :id AND balance.quantity <> 0
  ORDER BY bin.walk_order, bin.bin_key, lot.lot_code, balance.state`;

const ON_ORDER = `
  SELECT purchase_order.number AS reference, line.quantity - line.received AS quantity, line.due_on AS due,
    supplier.name AS supplier
  FROM purchase_order_line line
  JOIN purchase_order ON purchase_order.id = line.purchase_order_id
  LEFT JOIN supplier ON supplier.id = purchase_order.supplier_id
  WHERE line.part_id = :id AND purchase_order.state = 'sent' AND line.closed = FALSE AND line.quantity > line.received
  UNION ALL
  SELECT number, quantity - finished, due_on, NULL FROM shop_order
  WHERE part_id = :id AND state = 'released' AND quantity > finished
  ORDER BY due, reference`;

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
  return {
    ...presentPart(row, mayDo(person.roles, "see-costs")),
    balances: (await readRows<PartBalance>(BALANCES, named)).map(say),
    promised: (await readRows<PartAnswer["promised"][number]>(PROMISED, named)).map(say),
    onOrder: (await readRows<OpenOrder>(ON_ORDER, named)).map(say),
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
