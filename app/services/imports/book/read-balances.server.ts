import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import { trimDecimal } from "~/utils/format/trim-decimal";

/** What is on hand, by `balancePlace`, with the bins and the dates of lots that there are. */
export interface BookBalances {
  quantities: Map<string, string>;
  /** Bin as the book spells it, by key. */
  bins: Map<string, string>;
  /** Expiry date by `lotPlace`. */
  dates: Map<string, string | null>;
}

interface BalanceRow {
  partId: number;
  bin: string;
  lot: string;
  state: string;
  quantity: string;
}

export function balancePlace({ partId, bin, lot, state }: Omit<BalanceRow, "quantity">): string {
  return JSON.stringify([partId, partKey(bin), lot, state]);
}

export function lotPlace(partId: number, lot: string): string {
  return JSON.stringify([partId, lot]);
}

/** Reads every balance, bin and lot. */
export async function readBalances(transaction: Transaction): Promise<BookBalances> {
  const balances = await readRows<BalanceRow>(
    `SELECT balance.part_id AS partId, bin.code AS bin, lot.lot_code AS lot, state, quantity
     FROM balance JOIN bin ON bin.id = balance.bin_id JOIN lot ON lot.id = balance.lot_id`,
    {},
    transaction,
  );
  const bins = await readRows<{ code: string }>("SELECT code FROM bin", {}, transaction);
  const lots = await readRows<{ partId: number; lot: string; expiresOn: string | null }>(
    "SELECT part_id AS partId, lot_code AS lot, expires_on AS expiresOn FROM lot",
    {},
    transaction,
  );
  return {
    quantities: new Map(balances.map((row) => [balancePlace(row), trimDecimal(row.quantity)])),
    bins: new Map(bins.map(({ code }) => [partKey(code), code])),
    dates: new Map(lots.map(({ partId, lot, expiresOn }) => [lotPlace(partId, lot), expiresOn])),
  };
}
