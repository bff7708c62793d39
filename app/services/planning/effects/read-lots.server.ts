import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { BookChange } from "~/schemas/planning/effects";
import { trimDecimal } from "~/utils/format/trim-decimal";

interface StoredLot {
  /** `""` is stock without a lot. */
  lot: string;
  expiresOn: string | null;
  /** Null where none of it is held. */
  held: string | null;
}

/** Lots by part key. */
export type StoredLots = ReadonlyMap<string, StoredLot[]>;

const LOTS = `
  SELECT part.part_key AS partKey, lot.lot_code AS lot, lot.expires_on AS expiresOn, held.quantity AS held
  FROM lot
  JOIN part ON part.id = lot.part_id
  LEFT JOIN (SELECT lot_id, SUM(quantity) AS quantity FROM balance WHERE state = 'held' AND quantity > 0 GROUP BY lot_id) held
    ON held.lot_id = lot.id
  WHERE part.part_key IN (:keys)`;

/** What the shelves alone do not say of the lots that a change puts there: how long they keep, what is held of them. */
export async function readLots({
  stock,
  release,
}: Pick<BookChange, "stock" | "release">): Promise<StoredLots> {
  const adding = stock.filter(({ change }) => !change.startsWith("-"));
  const keys = [...new Set([...adding, ...release].map(({ partNumber }) => partKey(partNumber)))];
  const lots = new Map<string, StoredLot[]>();
  if (keys.length === 0) return lots;
  for (const { partKey: key, ...lot } of await readRows<StoredLot & { partKey: string }>(LOTS, { keys })) {
    const own = lots.get(key) ?? [];
    own.push({ ...lot, held: lot.held === null ? null : trimDecimal(lot.held) });
    lots.set(key, own);
  }
  return lots;
}
