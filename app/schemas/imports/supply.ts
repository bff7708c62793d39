import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { isoDate } from "~/schemas/fields/iso-date";
import { partNumber } from "~/schemas/fields/part-number";
import { quantity } from "~/schemas/fields/quantity";
import { code } from "~/schemas/fields/text";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    part_number: partNumber,
    quantity,
    due: emptyAs(isoDate, null),
    reference: emptyAs(code("an order number"), null),
  })
  .transform((cells) => ({
    partNumber: cells.part_number,
    quantity: cells.quantity,
    due: cells.due,
    reference: cells.reference,
  }));

export type SupplyRow = z.output<typeof row>;

export const supplyKind: ImportKind<SupplyRow> = {
  columns: { required: ["part_number", "quantity"], optional: ["due", "reference"] },
  row,
};
