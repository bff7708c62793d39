import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { PartRow } from "~/schemas/imports/parts";
import type { StoredRecord } from "~/services/imports/decide/decide-records";
import { trimDecimal } from "~/utils/format/trim-decimal";

type Read = Omit<PartRow, "sold"> & { id: number; partKey: string; sold: number };

const statement = `SELECT id, part_key AS partKey, part_number AS partNumber, description, sourcing, unit, decimals,
  lead_time_days AS leadTimeDays, safety_stock AS safetyStock, lot_rule AS lotRule, lot_minimum AS lotMinimum,
  lot_multiple AS lotMultiple, lot_maximum AS lotMaximum, lot_days AS lotDays, yield, unit_cost AS unitCost,
  mass_kg AS massKg, sold FROM part`;

export function trimOrNull(text: string | null): string | null {
  return text === null ? null : trimDecimal(text);
}

/** Every part of the book as a row of the parts file, by its key. */
export async function readPartRecords(transaction: Transaction): Promise<Map<string, StoredRecord<PartRow>>> {
  const rows = await readRows<Read>(statement, {}, transaction);
  return new Map(
    rows.map(({ id, partKey, ...row }) => {
      const value: PartRow = {
        ...row,
        safetyStock: trimDecimal(row.safetyStock),
        lotMinimum: trimOrNull(row.lotMinimum),
        lotMultiple: trimOrNull(row.lotMultiple),
        lotMaximum: trimOrNull(row.lotMaximum),
        yield: trimDecimal(row.yield),
        unitCost: trimOrNull(row.unitCost),
        massKg: trimOrNull(row.massKg),
        sold: Boolean(row.sold),
      };
      return [partKey, { id, value }];
    }),
  );
}
