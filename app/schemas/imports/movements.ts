import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { moment } from "~/schemas/fields/moment";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity } from "~/schemas/fields/quantity";
import { code, text } from "~/schemas/fields/text";
import { wholeNumber } from "~/schemas/fields/whole-number";
import { word } from "~/schemas/fields/word";
import type { ImportKind } from "./import-kind";

const bin = emptyAs(code("a bin code"), null);
const state = emptyAs(word("usable", "held", "staged", "with-supplier"), "usable" as const);

const row = z
  .object({
    happened_at: moment,
    kind: word("receive", "return", "issue", "scrap", "move", "hold", "release", "adjust", "reverse"),
    part_number: partNumber,
    lot: emptyAs(code("a lot code"), ""),
    from_bin: bin,
    from_state: state,
    to_bin: bin,
    to_state: state,
    quantity: positiveQuantity,
    reason: text(500),
    reference: text(120),
    number: emptyAs(wholeNumber(1, Number.MAX_SAFE_INTEGER), null),
    reverses: emptyAs(wholeNumber(1, Number.MAX_SAFE_INTEGER), null),
  })
  .superRefine(({ kind, reverses }, ctx) => {
    if ((kind === "reverse") === (reverses !== null)) return;
    const message = "the number of a movement above, on rows of kind reverse and on no others";
    ctx.addIssue({ code: "custom", path: ["reverses"], message });
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
    /** What rows of kind reverse call this movement by. */
    number: cells.number,
    reverses: cells.reverses,
  }));

export type MovementRow = z.output<typeof row>;

export const movementsKind: ImportKind<MovementRow> = {
  columns: {
    required: ["happened_at", "kind", "part_number", "quantity"],
    optional: [
      "lot",
      "from_bin",
      "from_state",
      "to_bin",
      "to_state",
      "reason",
      "reference",
      "number",
      "reverses",
    ],
  },
  row,
};
