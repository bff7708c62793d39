import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { partKey } from "~/domain/planning/part-key";
import { inChunks } from "./in-chunks";

/** What posting needs to know of a part. */
export interface StockPart {
  id: number;
  partKey: string;
  partNumber: string;
  unit: string;
  decimals: number;
}

/** Parts by key. Locked against change until the commit, so that a quantity fits the decimals it was checked with. */
export async function findStockParts(
  partNumbers: readonly string[],
  transaction: Transaction,
): Promise<Map<string, StockPart>> {
  const keys = [...new Set(partNumbers.map(partKey))].sort();
  const rows = await inChunks(keys, (chunk) =>
    sequelize.query<StockPart>(
      `SELECT id, part_key AS partKey, part_number AS partNumber, unit, decimals FROM part
       WHERE part_key IN (:keys) ORDER BY part_key LOCK IN SHARE MODE`,
      { replacements: { keys: chunk }, type: QueryTypes.SELECT, transaction },
    ),
  );
  return new Map(rows.flat().map((row) => [row.partKey, row]));
}
