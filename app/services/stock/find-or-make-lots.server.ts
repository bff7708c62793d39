import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { inChunks } from "./in-chunks";

export interface WantedLot {
  partId: number;
  /** "" is stock without a lot. */
  lotCode: string;
  /** Undefined or null leaves the date as it is. */
  expiresOn?: string | null;
}

interface LotRow {
  id: number;
  partId: number;
  lotCode: string;
  expiresOn: string | null;
}

/** The lots of these parts, those that are missing made and those with another expiry date changed, by `lotKey`. */
export async function findOrMakeLots(
  wanted: readonly WantedLot[],
  transaction: Transaction,
): Promise<Map<string, number>> {
  const partIds = [...new Set(wanted.map((lot) => lot.partId))].sort((a, b) => a - b);
  const known = await readLots(partIds, transaction);
  const outdated = mergeLots(wanted).filter((lot) => {
    const row = known.get(lotKey(lot));
    return !row || (lot.expiresOn && lot.expiresOn !== row.expiresOn);
  });
  if (outdated.length === 0) return idsOf(known);
  await inChunks(outdated, (chunk) => writeLots(chunk, transaction));
  return idsOf(await readLots(partIds, transaction));
}

export function lotKey({ partId, lotCode }: Pick<WantedLot, "partId" | "lotCode">): string {
  return `${partId}/${lotCode}`;
}

/** Each lot once, with the last date given for it, in the one order in which lots are locked. */
function mergeLots(wanted: readonly WantedLot[]): WantedLot[] {
  const lots = new Map<string, WantedLot>();
  for (const lot of wanted) {
    const expiresOn = lot.expiresOn ?? lots.get(lotKey(lot))?.expiresOn;
    lots.set(lotKey(lot), { ...lot, expiresOn });
  }
  return [...lots.values()].sort((a, b) => a.partId - b.partId || (a.lotCode < b.lotCode ? -1 : 1));
}

async function readLots(partIds: readonly number[], transaction: Transaction): Promise<Map<string, LotRow>> {
  const rows = await inChunks(partIds, (chunk) =>
    sequelize.query<LotRow>(
      "SELECT id, part_id AS partId, lot_code AS lotCode, expires_on AS expiresOn FROM lot WHERE part_id IN (:chunk)",
      { replacements: { chunk }, type: QueryTypes.SELECT, transaction },
    ),
  );
  return new Map(rows.flat().map((row) => [lotKey(row), row]));
}

async function writeLots(lots: readonly WantedLot[], transaction: Transaction): Promise<void> {
  const values = lots.map((lot) => [lot.partId, lot.lotCode, lot.expiresOn ?? null]);
  await sequelize.query(
    `INSERT INTO lot (part_id, lot_code, expires_on) VALUES :values
     ON DUPLICATE KEY UPDATE expires_on = COALESCE(VALUES(expires_on), expires_on)`,
    { replacements: { values }, type: QueryTypes.INSERT, transaction },
  );
}

function idsOf(rows: ReadonlyMap<string, LotRow>): Map<string, number> {
  return new Map([...rows].map(([key, row]) => [key, row.id]));
}
