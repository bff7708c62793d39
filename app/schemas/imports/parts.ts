import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { yieldFraction } from "~/schemas/fields/fraction";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity, quantity } from "~/schemas/fields/quantity";
import { text } from "~/schemas/fields/text";
import { unit } from "~/schemas/fields/unit";
import { wholeNumber } from "~/schemas/fields/whole-number";
import { word, yesNo } from "~/schemas/fields/word";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    part_number: partNumber,
    description: text(255),
    sourcing: word("buy", "make", "phantom"),
    unit: emptyAs(unit, "EA"),
    decimals: emptyAs(wholeNumber(0, 6), 0),
    lead_time_days: emptyAs(wholeNumber(0, 36_500), 0),
    safety_stock: emptyAs(quantity, "0"),
    lot_rule: emptyAs(word("lot-for-lot", "fixed-period"), "lot-for-lot" as const),
    lot_minimum: emptyAs(quantity, null),
    lot_multiple: emptyAs(quantity, null),
    lot_maximum: emptyAs(positiveQuantity, null),
    lot_days: emptyAs(wholeNumber(0, 36_500), null),
    yield: emptyAs(yieldFraction, "1"),
    unit_cost: emptyAs(quantity, null),
    mass_kg: emptyAs(quantity, null),
    sold: emptyAs(yesNo, false),
  })
  .transform((cells) => ({
    partNumber: cells.part_number,
    description: cells.description,
    sourcing: cells.sourcing,
    unit: cells.unit,
    decimals: cells.decimals,
    leadTimeDays: cells.lead_time_days,
    safetyStock: cells.safety_stock,
    lotRule: cells.lot_rule,
    lotMinimum: cells.lot_minimum,
    lotMultiple: cells.lot_multiple,
    lotMaximum: cells.lot_maximum,
    lotDays: cells.lot_days,
    yield: cells.yield,
    unitCost: cells.unit_cost,
    massKg: cells.mass_kg,
    sold: cells.sold,
  }));

export type PartRow = z.output<typeof row>;

export const partsKind: ImportKind<PartRow> = {
  columns: {
    required: ["part_number", "sourcing"],
    optional: [
      "description",
      "unit",
      "decimals",
      "lead_time_days",
      "safety_stock",
      "lot_rule",
      "lot_minimum",
      "lot_multiple",
      "lot_maximum",
      "lot_days",
      "yield",
      "unit_cost",
      "mass_kg",
      "sold",
    ],
  },
  row,
};
