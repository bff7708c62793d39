import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { code, text } from "~/schemas/fields/text";
import { wholeNumber } from "~/schemas/fields/whole-number";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    bin: code("a bin code"),
    zone: text(64),
    walk_order: emptyAs(wholeNumber(0, 1_000_000), 0),
    description: text(255),
  })
  .transform((cells) => ({
    bin: cells.bin,
    zone: cells.zone,
    walkOrder: cells.walk_order,
    description: cells.description,
  }));

export type BinRow = z.output<typeof row>;

export const binsKind: ImportKind<BinRow> = {
  columns: { required: ["bin"], optional: ["zone", "walk_order", "description"] },
  row,
};
