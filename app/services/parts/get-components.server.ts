import { readRows } from "~/db/read-rows.server";
import type { ComponentLine } from "~/schemas/find/part-page";
import { trimDecimal } from "~/utils/format/trim-decimal";

const LINES = `
  SELECT line.id, line.find_number AS findNumber, part.part_number AS partNumber, part.description, part.unit,
    line.quantity, line.scrap, line.option_code AS \`option\`, line.from_serial AS fromSerial,
    line.to_serial AS toSerial, line.from_date AS fromDate, line.to_date AS toDate
  FROM structure_line line
  JOIN part parent ON parent.id = line.parent_id
  JOIN part ON part.id = line.component_id
  WHERE parent.part_key = :key
  ORDER BY line.position, line.id`;

/** What one of the part is made of, in the order in which it was written down. */
export async function getComponents(partKey: string): Promise<ComponentLine[]> {
  const lines = await readRows<ComponentLine>(LINES, { key: partKey });
  return lines.map((line) => ({
    ...line,
    quantity: line.quantity === null ? null : trimDecimal(line.quantity),
    scrap: trimDecimal(line.scrap),
  }));
}
