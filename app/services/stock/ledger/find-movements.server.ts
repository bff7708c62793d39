import { readRows } from "~/db/read-rows.server";
import type { MovementsPage } from "~/schemas/stock/ledger-answers";
import { findFilterId } from "./find-filter-id.server";
import { readLedgerMovements } from "./read-ledger-movements.server";

interface MovementsQuery {
  partNumber?: string;
  /** The id after which the page begins. */
  after?: number;
}

const PAGE = 100;

const ALL = "SELECT id FROM movement WHERE id > :after ORDER BY id LIMIT :most";
const OF_PART = `SELECT DISTINCT movement_id AS id FROM movement_leg
  WHERE part_id = :partId AND movement_id > :after ORDER BY movement_id LIMIT :most`;

/** A page of the ledger in the order of its ids, with the cursor of the next. @throws AppError "not-found" for an unknown part */
export async function findMovements({ partNumber, after = 0 }: MovementsQuery): Promise<MovementsPage> {
  const partId = await findFilterId("partNumber", partNumber);
  const replacements = { partId, after, most: PAGE + 1 };
  const rows = await readRows<{ id: number }>(partId === null ? ALL : OF_PART, replacements);
  const ids = rows.slice(0, PAGE).map(({ id }) => id);
  return {
    movements: await readLedgerMovements(ids),
    next: rows.length > PAGE ? String(ids[PAGE - 1]) : null,
  };
}
