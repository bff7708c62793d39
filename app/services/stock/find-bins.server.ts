import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { partKey } from "~/domain/planning/part-key";
import { inChunks } from "./in-chunks";

interface BinRow {
  id: number;
  binKey: string;
  code: string;
}

/** Bins by key: the code made the same way as a part's key. */
export async function findBins(
  codes: readonly string[],
  transaction: Transaction,
): Promise<Map<string, BinRow>> {
  const keys = [...new Set(codes.map(partKey))].sort();
  const rows = await inChunks(keys, (chunk) =>
    sequelize.query<BinRow>("SELECT id, bin_key AS binKey, code FROM bin WHERE bin_key IN (:keys)", {
      replacements: { keys: chunk },
      type: QueryTypes.SELECT,
      transaction,
    }),
  );
  return new Map(rows.flat().map((row) => [row.binKey, row]));
}
