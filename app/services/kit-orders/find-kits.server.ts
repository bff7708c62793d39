import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { OrderableKit } from "~/schemas/kit-orders/presented-kit-order";

interface Row {
  partNumber: string;
  description: string;
  code: string | null;
  optionDescription: string | null;
}

/** Option lines stand on a kit or on phantoms under it, so the walk goes through phantoms only. */
const SELECT_KITS = `WITH RECURSIVE reach (kit_id, part_id) AS (
    SELECT id, id FROM part WHERE sold AND sourcing = 'make'
    UNION
    SELECT r.kit_id, c.id FROM reach r
      JOIN structure_line l ON l.parent_id = r.part_id
      JOIN part c ON c.id = l.component_id AND c.sourcing = 'phantom'
  )
  SELECT DISTINCT k.part_number AS partNumber, k.description, o.code, o.description AS optionDescription
  FROM reach r JOIN part k ON k.id = r.kit_id
    LEFT JOIN structure_line l ON l.parent_id = r.part_id AND l.option_code IS NOT NULL
    LEFT JOIN kit_option o ON o.code = l.option_code
  ORDER BY k.part_key, o.code`;

/** The kits that can be ordered, by part number, each with the options that its structure offers. */
export async function findKits(transaction?: Transaction): Promise<OrderableKit[]> {
  const kits = new Map<string, OrderableKit>();
  for (const row of await readRows<Row>(SELECT_KITS, {}, transaction)) {
    const kit = kits.get(row.partNumber) ?? {
      partNumber: row.partNumber,
      description: row.description,
      options: [],
    };
    if (row.code !== null) kit.options.push({ code: row.code, description: row.optionDescription ?? "" });
    kits.set(row.partNumber, kit);
  }
  return [...kits.values()];
}
