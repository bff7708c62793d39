import { z } from "zod";
import type { ShipCheck } from "~/domain/planning/types";
import { count, dayText, decimalText, missingPart } from "./values";

const demand = z.object({
  partNumber: z.string(),
  quantity: decimalText,
  due: dayText.nullable(),
  options: z.array(z.string()),
  serial: z.string().nullable(),
  buildable: count.nullable(),
  earliest: dayText,
});

const rung = z.object({
  partNumber: z.string(),
  kits: count,
  cost: decimalText.nullable(),
  readyOn: dayText,
  stoppers: z.array(missingPart),
});

const shortage = z.object({
  partNumber: z.string(),
  unit: z.string(),
  gross: decimalText,
  fromStock: decimalText,
  onOrder: decimalText,
  short: decimalText,
  missing: decimalText,
  stopsAt: count,
  needBy: dayText.nullable(),
  orderBy: dayText.nullable(),
  readyOn: dayText,
});

const build = z.object({
  partNumber: z.string(),
  unit: z.string(),
  gross: decimalText,
  fromStock: decimalText,
  onOrder: decimalText,
  build: decimalText,
});

export const chainLink = z.object({
  partNumber: z.string(),
  why: z.enum(["build", "buy", "on-order", "stock"]),
  readyOn: dayText,
});

const debt = z.object({ partNumber: z.string(), quantity: decimalText, from: count, to: count });

const warning = z.object({
  code: z.enum([
    "as-required-none-on-hand",
    "make-without-structure",
    "overdue-supply",
    "supply-without-date",
  ]),
  partNumber: z.string(),
});

/** Which kits can ship, and what stops the rest. */
export const shipCheckAnswer = z.object({
  today: dayText,
  demand: z.array(demand),
  buildable: z.record(z.string(), count.nullable()),
  earliest: z.record(z.string(), dayText),
  ladder: z.array(rung),
  shortages: z.array(shortage),
  builds: z.array(build),
  criticalChain: z.array(chainLink),
  debts: z.array(debt).optional(),
  warnings: z.array(warning),
}) satisfies z.ZodType<ShipCheck>;
