import { QueryTypes } from "sequelize";
import { sequelize } from "~/db/client.server";

const KEY = "part_id, bin_id, lot_id, state";

/** Each statement counts what must not be there. */
const QUESTIONS = {
  "balance differs from its movements": `SELECT COUNT(*) AS found FROM balance
    LEFT JOIN (SELECT ${KEY}, SUM(quantity) AS total FROM movement_leg WHERE place = 'bin' GROUP BY ${KEY}) AS legs
      USING (${KEY})
    WHERE balance.quantity <> COALESCE(legs.total, 0)`,
  "movements without a balance": `SELECT COUNT(*) AS found FROM movement_leg
    LEFT JOIN balance USING (${KEY}) WHERE place = 'bin' AND balance.id IS NULL`,
  "sequence gap": `SELECT COUNT(*) AS found FROM balance
    LEFT JOIN (SELECT ${KEY}, COUNT(*) AS legs, MIN(sequence) AS lowest, MAX(sequence) AS highest
      FROM movement_leg WHERE place = 'bin' GROUP BY ${KEY}) AS numbered USING (${KEY})
    WHERE balance.sequence <> COALESCE(numbered.legs, 0) OR balance.sequence <> COALESCE(numbered.highest, 0)
      OR COALESCE(numbered.lowest, 1) <> 1`,
  "movement whose legs do not sum to zero": `SELECT COUNT(*) AS found FROM
    (SELECT movement_id FROM movement_leg GROUP BY movement_id, part_id, lot_id HAVING SUM(quantity) <> 0) AS uneven`,
  "empty movement": `SELECT COUNT(*) AS found FROM movement
    LEFT JOIN movement_leg ON movement_leg.movement_id = movement.id WHERE movement_leg.id IS NULL`,
  "reversal that is not the opposite": `SELECT COUNT(*) AS found FROM
    (SELECT movement.id FROM movement JOIN movement_leg AS leg ON leg.movement_id IN (movement.id, movement.reverses)
      WHERE movement.reverses IS NOT NULL
      GROUP BY movement.id, leg.part_id, leg.lot_id, leg.place, leg.bin_id, leg.state HAVING SUM(leg.quantity) <> 0) AS uneven`,
  "key without result": `SELECT COUNT(*) AS found FROM idempotency_key WHERE status <> 'done' OR result IS NULL`,
  "negative balance not allowed": "SELECT COUNT(*) AS found FROM balance WHERE quantity < 0",
  "posted without its audit": `SELECT COUNT(*) AS found FROM movement
    LEFT JOIN audit_event ON audit_event.subject =
      CONVERT(CONCAT('movement ', COALESCE(movement.reverses, movement.id)) USING utf8mb4) COLLATE utf8mb4_bin
    WHERE movement.line = 0 AND audit_event.id IS NULL`,
  "acknowledged but not stored, or stored twice": `SELECT COUNT(*) AS found FROM idempotency_key
    LEFT JOIN (SELECT idempotency_key_id, COUNT(*) AS movements FROM movement GROUP BY idempotency_key_id) AS stored
      ON stored.idempotency_key_id = idempotency_key.id
    WHERE idempotency_key.status = 'done' AND JSON_TYPE(JSON_EXTRACT(idempotency_key.result, '$.movements')) = 'ARRAY'
      AND COALESCE(stored.movements, 0) <> JSON_LENGTH(idempotency_key.result, '$.movements')`,
} as const;

export type Invariant = keyof typeof QUESTIONS;

/**
 * Counts what the ledger must never hold: every number is 0 while all is well. Reads whole tables; meant for tests
 * and for the reconciliation, not for pages.
 */
export async function checkInvariants(): Promise<Record<Invariant, number>> {
  const answers: [string, number][] = [];
  for (const [name, question] of Object.entries(QUESTIONS)) {
    const [row] = await sequelize.query<{ found: number }>(question, { type: QueryTypes.SELECT });
    answers.push([name, row.found]);
  }
  return Object.fromEntries(answers) as Record<Invariant, number>;
}
