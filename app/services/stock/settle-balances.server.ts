import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { type BalancePlace, balanceKey, compareBalances } from "~/domain/stock/balance-key";
import { formatStored } from "~/domain/stock/format-stored";
import type { BinLeg } from "~/domain/stock/leg";
import { parseStored } from "~/domain/stock/parse-stored";
import { type BalanceChange, type RefusedLeg, settleLegs } from "~/domain/stock/settle-legs";
import { inChunks } from "./in-chunks";

interface BalanceRow extends BalancePlace {
  id: number;
  quantity: string;
  sequence: number;
}

type Settled = { ok: true; sequences: number[] } | { ok: false; refused: RefusedLeg[] };

/**
 * Changes the balances of these legs, locking them in the one order of part, bin, lot and state.
 * @returns the number of each leg within its balance, or the legs that there is not enough for; then nothing changed
 */
export async function settleBalances(legs: readonly BinLeg[], transaction: Transaction): Promise<Settled> {
  const places = [...new Map(legs.map((leg) => [balanceKey(leg), leg])).values()].sort(compareBalances);
  const rows = (await inChunks(places, (chunk) => lockBalances(chunk, transaction))).flat();
  const balances = new Map(
    rows.map((row) => [balanceKey(row), { quantity: parseStored(row.quantity), sequence: row.sequence }]),
  );
  const settled = settleLegs(legs, balances);
  if (!settled.ok) return settled;
  await inChunks(rows, (chunk) => changeBalances(chunk, settled.changes, transaction));
  return { ok: true, sequences: settled.sequences };
}

/** Makes balances that are missing and locks all of them in the order given; reading first and then inserting deadlocks. */
function lockBalances(places: readonly BalancePlace[], transaction: Transaction): Promise<BalanceRow[]> {
  const values = places.map(({ partId, binId, lotId, state }) => [partId, binId, lotId, state]);
  return sequelize.query<BalanceRow>(
    `INSERT INTO balance (part_id, bin_id, lot_id, state) VALUES :values
     ON DUPLICATE KEY UPDATE sequence = sequence
     RETURNING id, part_id AS partId, bin_id AS binId, lot_id AS lotId, state, quantity, sequence`,
    { replacements: { values }, type: QueryTypes.SELECT, transaction },
  );
}

/** The guard in the statement stands beside the one in the core: no stored balance is ever negative or overwritten. */
async function changeBalances(
  rows: readonly BalanceRow[],
  changes: ReadonlyMap<string, BalanceChange>,
  transaction: Transaction,
): Promise<void> {
  const deltas = rows.map((row, index) => deltaOf(row, changes, index === 0)).join(" UNION ALL ");
  const [, changed] = await sequelize.query(
    `UPDATE balance JOIN (${deltas}) AS delta ON delta.id = balance.id
     SET balance.quantity = balance.quantity + delta.quantity, balance.sequence = balance.sequence + delta.legs
     WHERE balance.sequence = delta.sequence AND balance.quantity + delta.quantity >= 0`,
    { type: QueryTypes.UPDATE, transaction },
  );
  if (changed !== rows.length) throw new Error("A locked balance has changed; nothing was posted.");
}

/** Decimals are cast, since a quoted one in a sum becomes a float. */
function deltaOf(row: BalanceRow, changes: ReadonlyMap<string, BalanceChange>, first: boolean): string {
  const { change, legs } = changes.get(balanceKey(row)) ?? { change: 0n, legs: 0 };
  const [id, quantity, count, sequence] = first
    ? ["id", "quantity", "legs", "sequence"].map((name) => ` AS ${name}`)
    : ["", "", "", ""];
  return `SELECT ${row.id}${id}, CAST('${formatStored(change)}' AS DECIMAL(20,6))${quantity}, ${legs}${count}, ${row.sequence}${sequence}`;
}
