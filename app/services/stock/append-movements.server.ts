import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { formatStored } from "~/domain/stock/format-stored";
import { isBinLeg, type Leg } from "~/domain/stock/leg";
import type { RefusedLeg } from "~/domain/stock/settle-legs";
import type { MovementKind } from "~/domain/stock/types";
import { inChunks } from "./in-chunks";
import { settleBalances } from "./settle-balances.server";

/** A movement that is checked and looked up. */
export interface MovementDraft {
  kind: MovementKind;
  happenedAt: Date;
  reason: string;
  reference: string;
  reverses: number | null;
  legs: readonly Leg[];
}

/** A movement that there is not enough stock for, by its place among the drafts. */
export type RefusedDraft = Omit<RefusedLeg, "leg"> & { draft: number; at: Leg };

interface Posting {
  keyId: number;
  personId: number | null;
  drafts: readonly MovementDraft[];
}

type Appended = { ok: true; ids: number[] } | { ok: false; refused: RefusedDraft[] };

/**
 * Appends movements with their legs and changes the balances: the only statements that write these tables.
 * @returns the new ids in the order of the drafts; or what there is not enough of, and then the caller must roll back
 */
export async function appendMovements(posting: Posting, transaction: Transaction): Promise<Appended> {
  const numbered = posting.drafts.map((draft, line) => ({ draft, line }));
  const inserted = await inChunks(numbered, (chunk) => insertMovements(chunk, posting, transaction));
  const idByLine = new Map(inserted.flat().map(({ id, line }) => [line, id]));
  const ids = numbered.map(({ line }) => idByLine.get(line) as number);
  const legs = posting.drafts.flatMap((draft, line) => draft.legs.map((leg) => ({ leg, line })));
  const binLegs = legs.flatMap(({ leg, line }) => (isBinLeg(leg) ? [{ leg, line }] : []));
  const settled = await settleBalances(
    binLegs.map(({ leg }) => leg),
    transaction,
  );
  if (!settled.ok) {
    const refused = settled.refused.map(({ leg: index, ...rest }) => ({
      ...rest,
      draft: binLegs[index].line,
      at: binLegs[index].leg,
    }));
    return { ok: false, refused };
  }
  const sequenceOf = new Map<Leg, number>(binLegs.map(({ leg }, index) => [leg, settled.sequences[index]]));
  await inChunks(legs, (chunk) =>
    insertLegs(
      chunk.map(({ leg, line }) => ({ leg, movementId: ids[line], sequence: sequenceOf.get(leg) ?? null })),
      transaction,
    ),
  );
  return { ok: true, ids };
}

function insertMovements(
  chunk: readonly { draft: MovementDraft; line: number }[],
  { keyId, personId }: Posting,
  transaction: Transaction,
): Promise<{ id: number; line: number }[]> {
  const values = chunk.map(({ draft, line }) => [
    keyId,
    line,
    draft.kind,
    toSqlMoment(draft.happenedAt),
    personId,
    draft.reason,
    draft.reference,
    draft.reverses,
  ]);
  return sequelize.query<{ id: number; line: number }>(
    `INSERT INTO movement (idempotency_key_id, line, kind, happened_at, person_id, reason, reference, reverses)
     VALUES :values RETURNING id, line`,
    { replacements: { values }, type: QueryTypes.SELECT, transaction },
  );
}

async function insertLegs(
  chunk: readonly { leg: Leg; movementId: number; sequence: number | null }[],
  transaction: Transaction,
): Promise<void> {
  const values = chunk.map(({ leg, movementId, sequence }) => [
    movementId,
    leg.partId,
    leg.lotId,
    leg.binId,
    leg.place,
    leg.state,
    formatStored(leg.quantity),
    sequence,
  ]);
  await sequelize.query(
    `INSERT INTO movement_leg (movement_id, part_id, lot_id, bin_id, place, state, quantity, sequence) VALUES :values`,
    { replacements: { values }, type: QueryTypes.INSERT, transaction },
  );
}

/** A Date among the replacements would lose its milliseconds. */
function toSqlMoment(moment: Date): string {
  return moment.toISOString().slice(0, 23).replace("T", " ");
}
