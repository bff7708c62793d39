import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { binsKind } from "~/schemas/imports/bins";
import { movementsKind } from "~/schemas/imports/movements";
import { stockKind } from "~/schemas/imports/stock";
import { columnsOf } from "~/services/exports/columns-of";
import type { ExportRow, ExportTable } from "~/services/exports/export-table";
import { readWhole, trimDecimals } from "~/services/exports/read-whole.server";

export const binsTable: ExportTable = {
  name: "bins",
  act: "look",
  columns: columnsOf(binsKind),
  read: readWhole("SELECT code AS bin, zone, walk_order, description FROM bin ORDER BY bin_key"),
};

/** Usable and held stock; what is staged or with a supplier is told by the movements alone. */
export const stockTable: ExportTable = {
  name: "stock",
  act: "look",
  columns: columnsOf(stockKind),
  read: readWhole(
    `SELECT part.part_number, bin.code AS bin, lot.lot_code AS lot, state, quantity, lot.expires_on
     FROM balance JOIN part ON part.id = balance.part_id JOIN bin ON bin.id = balance.bin_id
      JOIN lot ON lot.id = balance.lot_id
     WHERE quantity <> 0 AND state IN ('usable', 'held')
     ORDER BY part.part_key, bin.bin_key, lot.lot_code, state`,
    ["quantity"],
  ),
};

const PIECE = 5_000;

type Read = ExportRow & { id: number; reverses: number | null };

/** Each movement has two legs, one that takes away and one that brings; a reversal names the line that it takes back. */
function readPiece(after: number, transaction?: Transaction): Promise<Read[]> {
  return readRows<Read>(
    `SELECT movement.id, movement.reverses, 
      CONCAT(DATE_FORMAT(happened_at, '%Y-%m-%dT%H:%i:%s.'), LPAD(MICROSECOND(happened_at) DIV 1000, 3, '0'), 'Z')
        AS happened_at, kind,
      part.part_number, lot.lot_code AS lot, from_bin.code AS from_bin, taken.state AS from_state,
      to_bin.code AS to_bin, brought.state AS to_state, brought.quantity, reason, reference
     FROM movement JOIN movement_leg taken ON taken.movement_id = movement.id AND taken.quantity < 0
      JOIN movement_leg brought ON brought.movement_id = movement.id AND brought.quantity > 0
      JOIN part ON part.id = brought.part_id JOIN lot ON lot.id = brought.lot_id
      LEFT JOIN bin from_bin ON from_bin.id = taken.bin_id LEFT JOIN bin to_bin ON to_bin.id = brought.bin_id
     WHERE movement.id > :after ORDER BY movement.id LIMIT ${PIECE}`,
    { after },
    transaction,
  );
}

async function* readMovements(transaction?: Transaction): AsyncGenerator<ExportRow[]> {
  const numbers = new Map<number, number>();
  let after = 0;
  for (;;) {
    const rows = await readPiece(after, transaction);
    for (const row of rows) {
      numbers.set(row.id, numbers.size + 1);
      row.number = numbers.size;
      row.reverses = row.reverses === null ? null : (numbers.get(row.reverses) ?? null);
      trimDecimals(row, ["quantity"]);
    }
    yield rows;
    if (rows.length < PIECE) return;
    after = rows[rows.length - 1].id;
  }
}

export const movementsTable: ExportTable = {
  name: "movements",
  act: "look",
  columns: columnsOf(movementsKind),
  read: readMovements,
};
