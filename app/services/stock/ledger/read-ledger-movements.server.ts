import { readRows } from "~/db/read-rows.server";
import type { BalanceState, BinSide, MovementKind } from "~/domain/stock/types";
import type { LedgerMovement } from "~/schemas/stock/ledger-answers";
import { formatDecimals } from "~/utils/format/format-decimals";

interface Row {
  id: number;
  kind: MovementKind;
  happenedAt: Date;
  enteredAt: Date;
  person: string | null;
  reason: string;
  reference: string;
  reverses: number | null;
  reversedBy: number | null;
  partNumber: string;
  unit: string;
  decimals: number;
  lot: string;
  bin: string | null;
  state: BalanceState | null;
  quantity: string;
}

const SELECT = `
  SELECT movement.id, movement.kind, movement.happened_at AS happenedAt, movement.entered_at AS enteredAt,
    person.name AS person, movement.reason, movement.reference, movement.reverses, reversal.id AS reversedBy,
    part.part_number AS partNumber, part.unit, part.decimals, lot.lot_code AS lot, bin.code AS bin, leg.state, leg.quantity
  FROM movement JOIN movement_leg AS leg ON leg.movement_id = movement.id
  JOIN part ON part.id = leg.part_id JOIN lot ON lot.id = leg.lot_id
  LEFT JOIN bin ON bin.id = leg.bin_id LEFT JOIN person ON person.id = movement.person_id
  LEFT JOIN movement AS reversal ON reversal.reverses = movement.id
  WHERE movement.id IN (:ids) ORDER BY movement.id, leg.id`;

/** These movements in the order of their ids, each with its two sides. */
export async function readLedgerMovements(ids: readonly number[]): Promise<LedgerMovement[]> {
  if (ids.length === 0) return [];
  const movements = new Map<number, LedgerMovement>();
  for (const row of await readRows<Row>(SELECT, { ids })) {
    const movement = movements.get(row.id) ?? presentMovement(row);
    movements.set(row.id, movement);
    const side: BinSide | null = row.bin && row.state ? { bin: row.bin, state: row.state } : null;
    if (row.quantity.startsWith("-")) movement.from = side;
    else movement.to = side;
  }
  return [...movements.values()];
}

function presentMovement(row: Row): LedgerMovement {
  const { decimals, bin: _bin, state: _state, quantity, happenedAt, enteredAt, ...rest } = row;
  return {
    ...rest,
    quantity: formatDecimals(quantity.replace(/^-/, ""), decimals),
    from: null,
    to: null,
    happenedAt: happenedAt.toISOString(),
    enteredAt: enteredAt.toISOString(),
  };
}
