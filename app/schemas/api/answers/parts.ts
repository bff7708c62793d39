import { z } from "zod";
import { count, dayText, decimalText, sourcing } from "./values";

const part = z.object({
  partNumber: z.string(),
  description: z.string(),
  sourcing,
  unit: z.string(),
  decimals: count,
  leadTimeDays: count,
  safetyStock: decimalText,
  lotRule: z.string(),
  lotMinimum: decimalText.nullable(),
  lotMultiple: decimalText.nullable(),
  lotMaximum: decimalText.nullable(),
  lotDays: count.nullable(),
  yield: decimalText,
  unitCost: decimalText.nullable(),
  massKg: decimalText.nullable(),
  sold: z.boolean(),
});

export const partsAnswer = z.object({ page: count, size: count, total: count, parts: z.array(part) });

const whereUsedLine = z.object({
  partNumber: z.string(),
  description: z.string(),
  findNumber: z.string().nullable(),
  quantity: decimalText.nullable(),
  option: z.string().nullable(),
  fromSerial: z.string().nullable(),
  toSerial: z.string().nullable(),
});

export const whereUsedAnswer = z.object({ partNumber: z.string(), parents: z.array(whereUsedLine) });

const balance = z.object({
  bin: z.string(),
  lot: z.string().nullable(),
  state: z.string(),
  quantity: decimalText,
  expiresOn: dayText.nullable(),
  standing: z.enum(["usable", "held", "expired", "staged", "with-supplier"]),
});

const openOrder = z.object({
  kind: z.enum(["purchase-order", "shop-order"]),
  reference: z.string(),
  quantity: decimalText,
  due: dayText.nullable(),
  supplier: z.string().nullable(),
  isOverdue: z.boolean(),
});

const totals = z.object({
  onHand: decimalText,
  usable: decimalText,
  held: decimalText,
  expired: decimalText,
  staged: decimalText,
  withSupplier: decimalText,
  promised: decimalText,
  available: decimalText,
  onOrder: decimalText,
});

export const partAnswer = part.extend({
  totals,
  balances: z.array(balance),
  promised: z.array(z.object({ reference: z.string(), quantity: decimalText })),
  onOrder: z.array(openOrder),
  whereUsed: z.array(whereUsedLine),
});

/** A tree: a part repeats wherever it stands. */
export const structureAnswer = z.object({
  partNumber: z.string(),
  description: z.string(),
  sourcing,
  unit: z.string(),
  quantity: decimalText.nullable(),
  scrap: decimalText.nullable(),
  option: z.string().nullable(),
  fromSerial: z.string().nullable(),
  toSerial: z.string().nullable(),
  fromDate: dayText.nullable(),
  toDate: dayText.nullable(),
  get components() {
    return z.array(structureAnswer);
  },
});
