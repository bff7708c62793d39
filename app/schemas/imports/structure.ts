import { z } from "zod";
import { parseSerial, serialWithin } from "~/domain/planning/netting/serial";
import { emptyAs } from "~/schemas/fields/empty-as";
import { scrapFraction } from "~/schemas/fields/fraction";
import { isoDate } from "~/schemas/fields/iso-date";
import { partNumber } from "~/schemas/fields/part-number";
import { quantity } from "~/schemas/fields/quantity";
import { code, text } from "~/schemas/fields/text";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    parent: partNumber,
    component: partNumber,
    quantity: emptyAs(quantity, null),
    scrap: emptyAs(scrapFraction, "0"),
    find_number: emptyAs(text(32), null),
    option: emptyAs(code("an option code"), null),
    from_serial: emptyAs(code("a serial"), null),
    to_serial: emptyAs(code("a serial"), null),
    from_date: emptyAs(isoDate, null),
    to_date: emptyAs(isoDate, null),
  })
  .superRefine((cells, ctx) => {
    const refuse = (column: string, message: string) =>
      ctx.addIssue({ code: "custom", path: [column], message });
    const { from_date: fromDate, to_date: toDate, from_serial: fromSerial, to_serial: toSerial } = cells;
    if (fromDate !== null && toDate !== null && toDate < fromDate) {
      refuse("to_date", `a day not before from_date ${fromDate}`);
    }
    const first = fromSerial === null ? null : parseSerial(fromSerial);
    if (first !== null && toSerial !== null && !serialWithin(first, null, toSerial)) {
      refuse("to_serial", `a serial not before from_serial ${fromSerial}`);
    }
  })
  .transform((cells) => ({
    parent: cells.parent,
    component: cells.component,
    quantity: cells.quantity,
    scrap: cells.scrap,
    findNumber: cells.find_number,
    option: cells.option,
    fromSerial: cells.from_serial,
    toSerial: cells.to_serial,
    fromDate: cells.from_date,
    toDate: cells.to_date,
  }));

export type StructureRow = z.output<typeof row>;

export const structureKind: ImportKind<StructureRow> = {
  columns: {
    required: ["parent", "component", "quantity"],
    optional: ["scrap", "find_number", "option", "from_serial", "to_serial", "from_date", "to_date"],
  },
  row,
};
