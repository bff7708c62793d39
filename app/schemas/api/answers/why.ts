import { z } from "zod";
import type { WhyAnswer } from "~/schemas/planning/why";
import { checkQuestion } from "./check-answer";
import { chainLink } from "./ship-check";
import { count, dayText, decimalText, sourcing } from "./values";

const part = z.object({
  partNumber: z.string(),
  description: z.string(),
  unit: z.string(),
  decimals: count,
  sourcing,
});

const cause = z.object({
  parent: part,
  through: decimalText,
  quantity: decimalText,
  scrap: decimalText,
  option: z.string().nullable(),
  need: decimalText,
  isRounded: z.boolean(),
});

const demand = z.object({
  kitOrder: z.string().nullable(),
  customer: z.string().nullable(),
  quantity: decimalText,
  due: dayText.nullable(),
});

const cover = z.object({
  name: z.string().nullable(),
  used: decimalText,
  day: dayText.nullable(),
  flag: z.enum(["overdue", "undated"]).nullable(),
});

const outOfReach = z.object({
  bin: z.string(),
  lot: z.string(),
  state: z.enum(["held", "staged", "with-supplier", "expired"]),
  quantity: decimalText,
  expiresOn: dayText.nullable(),
});

export const whyAnswer = z.object({
  question: checkQuestion,
  through: z.string().nullable(),
  kits: count,
  with: z.enum(["stock", "orders"]),
  today: dayText,
  part,
  gross: decimalText,
  demands: z.array(demand),
  causes: z.array(cause),
  fromStock: decimalText,
  lots: z.array(cover).nullable(),
  onOrder: decimalText,
  orders: z.array(cover),
  rest: decimalText,
  restIs: z.enum(["missing", "short", "built", "passed on"]),
  started: decimalText,
  yield: decimalText,
  components: z.array(z.object({ component: part, need: decimalText, lacking: decimalText.nullable() })),
  outOfReach: z.array(outOfReach),
  readyOn: dayText,
  chain: z.array(chainLink),
  leadTimeDays: count,
}) satisfies z.ZodType<WhyAnswer>;
