import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import type { MovementKind } from "~/domain/stock/types";

export interface MovementRow {
  id: number;
  kind: MovementKind;
  happenedAt: Date;
  enteredAt: Date;
  personId: number | null;
  reference: string;
  /** The movement that takes this one back. */
  reversedBy: number | null;
}

/** One movement without its legs. */
export async function findMovement(id: number, transaction: Transaction): Promise<MovementRow | undefined> {
  const [row] = await sequelize.query<MovementRow>(
    `SELECT movement.id, movement.kind, movement.happened_at AS happenedAt, movement.entered_at AS enteredAt,
       movement.person_id AS personId, movement.reference, reversal.id AS reversedBy
     FROM movement LEFT JOIN movement AS reversal ON reversal.reverses = movement.id WHERE movement.id = :id`,
    { replacements: { id }, type: QueryTypes.SELECT, transaction },
  );
  return row;
}
