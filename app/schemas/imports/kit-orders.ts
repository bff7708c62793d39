import { z } from "zod";
import { parseSerial } from "~/domain/planning/netting/serial";
import { emptyAs } from "~/schemas/fields/empty-as";
import { isoDate } from "~/schemas/fields/iso-date";
import { optionCodes } from "~/schemas/fields/option-codes";
import { partNumber } from "~/schemas/fields/part-number";
import { code, text } from "~/schemas/fields/text";
import { wholeNumber } from "~/schemas/fields/whole-number";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    number: code("a kit order number", 60).refine(
      (number) => /^[\p{L}\p{N}][\p{L}\p{N}._-]*$/u.test(number),
      "letters, digits, points, dashes and underscores, such as KO-0042",
    ),
    kit: partNumber,
    customer: text(190),
    serial: emptyAs(
      code("a serial", 60).refine(
        (serial) => parseSerial(serial) !== null,
        "a serial that ends in digits, fifteen at most, such as 098",
      ),
      null,
    ),
    wanted_on: emptyAs(isoDate, null),
    priority: emptyAs(wholeNumber(1, 9_999), 100),
    options: optionCodes,
    note: text(1_000),
  })
  .transform((cells) => ({
    number: cells.number,
    kit: cells.kit,
    customer: cells.customer,
    serial: cells.serial,
    wantedOn: cells.wanted_on,
    priority: cells.priority,
    options: cells.options,
    note: cells.note,
  }));

export type KitOrderRow = z.output<typeof row>;

export const kitOrdersKind: ImportKind<KitOrderRow> = {
  columns: {
    required: ["number", "kit"],
    optional: ["customer", "serial", "wanted_on", "priority", "options", "note"],
  },
  row,
};
