import { z } from "zod";
import { currency } from "~/schemas/fields/currency";
import { emptyAs } from "~/schemas/fields/empty-as";
import { code, text } from "~/schemas/fields/text";
import { wholeNumber } from "~/schemas/fields/whole-number";
import type { ImportKind } from "./import-kind";

const row = z
  .object({
    supplier: code("a supplier code"),
    name: text(255),
    email: emptyAs(
      z
        .string()
        .trim()
        .pipe(z.email("a mail address such as orders@firm.example").max(190, "at most 190 characters")),
      "",
    ),
    phone: text(64),
    currency: emptyAs(currency, "EUR"),
    lead_time_days: emptyAs(wholeNumber(0, 36_500), null),
    note: text(2_000),
  })
  .transform((cells) => ({
    supplier: cells.supplier,
    name: cells.name || cells.supplier,
    email: cells.email,
    phone: cells.phone,
    currency: cells.currency,
    leadTimeDays: cells.lead_time_days,
    note: cells.note,
  }));

export type SupplierRow = z.output<typeof row>;

export const suppliersKind: ImportKind<SupplierRow> = {
  columns: {
    required: ["supplier"],
    optional: ["name", "email", "phone", "currency", "lead_time_days", "note"],
  },
  row,
};
