import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { moment } from "~/schemas/fields/moment";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity } from "~/schemas/fields/quantity";
import { code, text } from "~/schemas/fields/text";
import { word } from "~/schemas/fields/word";
import type { ImportKind } from "./import-kind";

const bin = emptyAs(code("a bin code"), null);
const state = emptyAs(word("usable", "held", "staged", "with-supplier"), "usable" as const);

const row = z
  .object({
    happened_at: moment,
    kind: word("receive", "return", "issue", "scrap", "move", "hold", "release", "adjust"),
    part_number: partNumber,
    lot: emptyAs(code("a lot code"), ""),
    from_bin: bin,
    from_state: state,
    to_bin: bin,
    to_state: state,
    quantity: positiveQuantity,
    reason: text(500),
    reference: text(120),
  })
  .transform((cells) => ({
    happenedAt: cells.happened_at,
    kind: cells.kind,
    partNumber: cells.part_number,
    lot: cells.lot,
    from: cells.from_bin === null ? null : { bin: cells.from_bin, state: cells.from_state },
    to: cells.to_bin === null ? null : { bin: cells.to_bin, state: cells.to_state },
    quantity: cells.quantity,
    reason: cells.reason,
    reference: cells.reference,
  }));

export type MovementRow = z.output<typeof row>;

export const movementsKind: ImportKind<MovementRow> = {
  columns: {
    required: ["happened_at", "kind", "part_number", "quantity"],
    optional: ["lot", "from_bin", "from_state", "to_bin", "to_state", "reason", "reference"],
  },
  row,
};
