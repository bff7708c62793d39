import { QueryTypes } from "sequelize";
import { sequelize } from "~/db/client.server";
import { inTransaction } from "~/db/in-transaction.server";
import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { getShipLine } from "~/services/planning/get-ship-line.server";
import { describeError, log } from "~/utils/http-log.server";

export interface TellsShipLine {
  /** As it was right after the act; null where it could not be worked out. */
  shipLine: ShipLineAnswer | null;
}

/**
 * The answer of an act with the ship line after it. The ship line is kept with the answer under its key, so that the
 * same key again gives the first answer back whole, whatever was posted since. It never makes an act fail that is done.
 */
export async function tellShipLine<Answer extends object>(
  key: string,
  answer: Answer,
): Promise<Answer & TellsShipLine> {
  if ("shipLine" in answer) return answer as Answer & TellsShipLine;
  try {
    return { ...answer, shipLine: await keepShipLine(key, await getShipLine()) };
  } catch (error) {
    log.error({ error: describeError(error) }, "no ship line after an act");
    return { ...answer, shipLine: null };
  }
}

/** Of two that come at the same time the first is kept, and told by both. */
function keepShipLine(key: string, shipLine: ShipLineAnswer): Promise<ShipLineAnswer> {
  return inTransaction(async (transaction) => {
    await sequelize.query(
      "UPDATE idempotency_key SET result = JSON_INSERT(result, '$.shipLine', JSON_EXTRACT(:shipLine, '$')) WHERE `key` = :key",
      { replacements: { key, shipLine: JSON.stringify(shipLine) }, type: QueryTypes.UPDATE, transaction },
    );
    const [{ result }] = await sequelize.query<{ result: TellsShipLine }>(
      "SELECT result FROM idempotency_key WHERE `key` = :key",
      { replacements: { key }, type: QueryTypes.SELECT, transaction },
    );
    return result.shipLine ?? shipLine;
  });
}
