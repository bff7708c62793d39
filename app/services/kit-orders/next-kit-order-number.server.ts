import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";

/** The number that an order entered without one gets: KO-0001 and on. */
export async function nextKitOrderNumber(transaction?: Transaction): Promise<string> {
  const [row] = await readRows<{ last: number | string }>(
    `SELECT COALESCE(MAX(CAST(SUBSTRING(number, 4) AS UNSIGNED)), 0) AS last
     FROM kit_order WHERE number REGEXP '^KO-[0-9]{1,9}$'`,
    {},
    transaction,
  );
  return `KO-${String(Number(row.last) + 1).padStart(4, "0")}`;
}
