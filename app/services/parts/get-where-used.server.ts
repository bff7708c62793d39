import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { WhereUsedLine } from "~/schemas/parts/part-answer";
import { AppError } from "~/utils/errors";
import { trimDecimal } from "~/utils/format/trim-decimal";

export interface WhereUsedAnswer {
  partNumber: string;
  parents: WhereUsedLine[];
}

const PARENTS = `
  SELECT parent.part_number AS partNumber, parent.description, line.find_number AS findNumber, line.quantity,
    line.option_code AS \`option\`, line.from_serial AS fromSerial, line.to_serial AS toSerial
  FROM structure_line line JOIN part parent ON parent.id = line.parent_id
  WHERE line.component_id = :id
  ORDER BY parent.part_key, line.position, line.id`;

/** The parents that take the part directly, one entry a line, by part number. */
export async function getWhereUsed(partNumber: string): Promise<WhereUsedAnswer> {
  const [part] = await readRows<{ id: number; partNumber: string }>(
    "SELECT id, part_number AS partNumber FROM part WHERE part_key = :key",
    { key: partKey(partNumber) },
  );
  if (!part)
    throw new AppError(
      "not-found",
      `There is no part ${partNumber} in the book. Check the number or search for it.`,
    );
  const parents = await readRows<WhereUsedLine>(PARENTS, { id: part.id });
  return {
    partNumber: part.partNumber,
    parents: parents.map((line) => ({
      ...line,
      quantity: line.quantity === null ? null : trimDecimal(line.quantity),
    })),
  };
}
