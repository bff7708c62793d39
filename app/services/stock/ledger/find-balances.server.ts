import { readRows } from "~/db/read-rows.server";
import type { StockAnswer, StockBalance } from "~/schemas/stock/ledger-answers";
import { standingOf } from "~/services/parts/sum-part-stock";
import { today } from "~/utils/clock";
import { formatDecimals } from "~/utils/format/format-decimals";
import { findFilterId } from "./find-filter-id.server";

type Row = Omit<StockBalance, "standing"> & { decimals: number };

/** Balances in the order of parts and of the walk through the bins. @throws AppError "not-found" for an unknown part or bin */
export async function findBalances(query: { partNumber?: string; bin?: string }): Promise<StockAnswer> {
  const partId = await findFilterId("partNumber", query.partNumber);
  const binId = await findFilterId("bin", query.bin);
  const rows = await readRows<Row>(
    `SELECT part.part_number AS partNumber, part.unit, part.decimals, bin.code AS bin, NULLIF(lot.lot_code, '') AS lot,
       balance.state, balance.quantity, lot.expires_on AS expiresOn
     FROM balance JOIN part ON part.id = balance.part_id JOIN bin ON bin.id = balance.bin_id
     JOIN lot ON lot.id = balance.lot_id
     WHERE balance.quantity <> 0 ${partId === null ? "" : "AND balance.part_id = :partId"}
       ${binId === null ? "" : "AND balance.bin_id = :binId"}
     ORDER BY part.part_key, bin.walk_order, bin.bin_key, lot.lot_code, balance.state`,
    { partId, binId },
  );
  const day = today();
  const balances = rows.map(({ decimals, ...row }) => ({
    ...row,
    quantity: formatDecimals(row.quantity, decimals),
    standing: standingOf(row.state, row.expiresOn, day),
  }));
  return { balances };
}
