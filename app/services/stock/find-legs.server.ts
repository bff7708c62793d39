import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { Leg } from "~/domain/stock/leg";
import { parseStored } from "~/domain/stock/parse-stored";

/** A leg with the words for it. */
interface NamedLeg {
  leg: Leg;
  partNumber: string;
  decimals: number;
  unit: string;
  /** "" outside of the bins. */
  bin: string;
  lotCode: string;
}

type Row = Omit<NamedLeg, "leg"> & Omit<Leg, "quantity"> & { quantity: string };

/** The legs of a movement in the order in which they were posted. */
export async function findLegs(movementId: number, transaction: Transaction): Promise<NamedLeg[]> {
  const rows = await sequelize.query<Row>(
    `SELECT leg.part_id AS partId, leg.lot_id AS lotId, leg.bin_id AS binId, leg.place, leg.state, leg.quantity,
       part.part_number AS partNumber, part.decimals, part.unit, COALESCE(bin.code, '') AS bin, lot.lot_code AS lotCode
     FROM movement_leg AS leg JOIN part ON part.id = leg.part_id JOIN lot ON lot.id = leg.lot_id
     LEFT JOIN bin ON bin.id = leg.bin_id WHERE leg.movement_id = :movementId ORDER BY leg.id`,
    { replacements: { movementId }, type: QueryTypes.SELECT, transaction },
  );
  return rows.map(({ partNumber, decimals, unit, bin, lotCode, quantity, ...leg }) => ({
    leg: { ...leg, quantity: parseStored(quantity) },
    partNumber,
    decimals,
    unit,
    bin,
    lotCode,
  }));
}
