import { z } from "zod";
import { currency } from "~/schemas/fields/currency";
import { emptyAs } from "~/schemas/fields/empty-as";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity, quantity } from "~/schemas/fields/quantity";
import { code, text } from "~/schemas/fields/text";
import { unit } from "~/schemas/fields/unit";
import { wholeNumber } from "~/schemas/fields/whole-number";
import { yesNo } from "~/schemas/fields/word";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    supplier: code("a supplier code"),
    part_number: partNumber,
    supplier_part_number: text(64),
    buying_unit: emptyAs(unit, null),
    per_buying_unit: emptyAs(positiveQuantity, "1"),
    minimum: emptyAs(quantity, null),
    multiple: emptyAs(quantity, null),
    from_quantity: emptyAs(quantity, "0"),
    unit_price: emptyAs(quantity, "0"),
    currency: emptyAs(currency, null),
    lead_time_days: emptyAs(wholeNumber(0, 36_500), null),
    preferred: emptyAs(yesNo, false),
  })
  .transform((cells) => ({
    supplier: cells.supplier,
    partNumber: cells.part_number,
    supplierPartNumber: cells.supplier_part_number,
    /** null: the part's own unit. */
    buyingUnit: cells.buying_unit,
    perBuyingUnit: cells.per_buying_unit,
    minimum: cells.minimum,
    multiple: cells.multiple,
    fromQuantity: cells.from_quantity,
    unitPrice: cells.unit_price,
    /** null: the supplier's currency. */
    currency: cells.currency,
    leadTimeDays: cells.lead_time_days,
    preferred: cells.preferred,
  }));

export type OfferRow = z.output<typeof row>;

export const offersKind: ImportKind<OfferRow> = {
  columns: {
    required: ["supplier", "part_number"],
    optional: [
      "supplier_part_number",
      "buying_unit",
      "per_buying_unit",
      "minimum",
      "multiple",
      "from_quantity",
      "unit_price",
      "currency",
      "lead_time_days",
      "preferred",
    ],
  },
  row,
};
