import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { isoDate } from "~/schemas/fields/iso-date";
import { partNumber } from "~/schemas/fields/part-number";
import { quantity } from "~/schemas/fields/quantity";
import { code } from "~/schemas/fields/text";
import { word } from "~/schemas/fields/word";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    part_number: partNumber,
    bin: emptyAs(code("a bin code"), ""),
    lot: emptyAs(code("a lot code"), ""),
    state: emptyAs(word("usable", "held"), "usable" as const),
    quantity,
    expires_on: emptyAs(isoDate, null),
  })
  .transform((cells) => ({
    partNumber: cells.part_number,
    bin: cells.bin,
    lot: cells.lot,
    state: cells.state,
    quantity: cells.quantity,
    expiresOn: cells.expires_on,
  }));

export type StockRow = z.output<typeof row>;

export const stockKind: ImportKind<StockRow> = {
  columns: { required: ["part_number", "quantity"], optional: ["bin", "lot", "state", "expires_on"] },
  row,
};
