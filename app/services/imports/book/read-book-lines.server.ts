import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { StructureRow } from "~/schemas/imports/structure";
import { trimDecimal } from "~/utils/format/trim-decimal";
import { trimOrNull } from "./read-part-records.server";

const statement = `SELECT parent.part_number AS parent, component.part_number AS component, line.quantity, line.scrap,
  line.find_number AS findNumber, line.option_code AS \`option\`, line.from_serial AS fromSerial,
  line.to_serial AS toSerial, line.from_date AS fromDate, line.to_date AS toDate
  FROM structure_line line
  JOIN part parent ON parent.id = line.parent_id
  JOIN part component ON component.id = line.component_id
  ORDER BY line.parent_id, line.position, line.id`;

/** Every structure line of the book as a row of the structure file, parent by parent in their order. */
export async function readBookLines(transaction: Transaction): Promise<StructureRow[]> {
  const rows = await readRows<StructureRow>(statement, {}, transaction);
  return rows.map((row) => ({ ...row, quantity: trimOrNull(row.quantity), scrap: trimDecimal(row.scrap) }));
}
