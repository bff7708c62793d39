import { readRows } from "~/db/read-rows.server";
import type { IsoDate } from "~/domain/planning/types";
import type { WhyOutOfReach } from "~/schemas/planning/why";
import { trimDecimal } from "~/utils/format/trim-decimal";

const ROWS = `
  SELECT bin.code AS bin, lot.lot_code AS lot, IF(balance.state = 'usable', 'expired', balance.state) AS state,
    balance.quantity, lot.expires_on AS expiresOn
  FROM balance
  JOIN part ON part.id = balance.part_id
  JOIN bin ON bin.id = balance.bin_id
  JOIN lot ON lot.id = balance.lot_id
  WHERE part.part_key = :key AND balance.quantity > 0
    AND (balance.state <> 'usable' OR lot.expires_on < :day)
  ORDER BY bin.walk_order, bin.bin_key, lot.lot_code, balance.state`;

/** Stock of a part that is there and does not count: held, staged, with a supplier, or expired by the day. */
export async function findOutOfReach(key: string, day: IsoDate): Promise<WhyOutOfReach[]> {
  const rows = await readRows<WhyOutOfReach>(ROWS, { key, day });
  return rows.map((row) => ({ ...row, quantity: trimDecimal(row.quantity) }));
}
