import { z } from "zod";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { shipCheckAnswer } from "./ship-check";
import { count, dayText, decimalText, sourcing } from "./values";

export const checkQuestion = z.object({
  kit: z.string().nullable(),
  quantity: z.int().min(1),
  by: dayText.nullable(),
  options: z.array(z.string()),
  ifs: z.array(z.string()),
});

const checkPart = z.object({
  partNumber: z.string(),
  description: z.string(),
  sourcing,
  unit: z.string(),
  decimals: count,
  supplier: z.string().nullable(),
  leadTimeDays: count,
  unitCost: decimalText.nullable(),
  hasLaterOrders: z.boolean(),
  cost: decimalText.nullable(),
});

const checkKit = z.object({
  partNumber: z.string(),
  description: z.string(),
  options: z.array(z.object({ code: z.string(), description: z.string() })),
});

export const checkPageAnswer = z.object({
  question: checkQuestion,
  answer: shipCheckAnswer.nullable(),
  problem: z.string().nullable(),
  parts: z.array(checkPart),
  kits: z.array(checkKit),
  stoppers: z.array(z.string()),
  totalParts: count,
  seesCosts: z.boolean(),
  readyByDate: count.nullable(),
  ifs: z.array(z.object({ text: z.string(), problem: z.string().nullable() })),
  without: z
    .object({ buildable: count.nullable(), earliest: dayText, cost: decimalText.nullable() })
    .nullable(),
}) satisfies z.ZodType<CheckPageAnswer>;
