import { z } from "zod";
import type { MovementsPage, StockAnswer } from "~/schemas/stock/ledger-answers";
import { balanceState, movementKind, postedKind } from "~/schemas/stock/movement-fields";
import { shipLineAnswer } from "./ship-line";
import { count, dayText, decimalText } from "./values";

const side = z.object({ bin: z.string(), state: balanceState }).nullable();
const moment = z.iso.datetime();

const movement = {
  id: z.int().min(1),
  partNumber: z.string(),
  quantity: decimalText,
  lot: z.string().describe("Empty for stock without a lot"),
  from: side,
  to: side,
  happenedAt: moment,
  reason: z.string(),
  reference: z.string(),
};

const told = {
  revision: count,
  shipLine: shipLineAnswer.nullable().describe("Null where it could not be worked out just then"),
};

export const postedAnswer = z.object({
  movements: z.array(z.object({ ...movement, kind: postedKind })),
  ...told,
});

export const reversedAnswer = z.object({ id: z.int().min(1), reverses: z.int().min(1), ...told });

export const movementsAnswer = z.object({
  movements: z.array(
    z.object({
      ...movement,
      kind: movementKind,
      unit: z.string(),
      enteredAt: moment,
      person: z.string().nullable(),
      reverses: z.int().nullable(),
      reversedBy: z.int().nullable(),
    }),
  ),
  next: z.string().nullable(),
}) satisfies z.ZodType<MovementsPage>;

export const stockAnswer = z.object({
  balances: z.array(
    z.object({
      partNumber: z.string(),
      unit: z.string(),
      bin: z.string(),
      lot: z.string().nullable(),
      state: balanceState,
      quantity: decimalText,
      expiresOn: dayText.nullable(),
      standing: z.enum(["usable", "held", "expired", "staged", "with-supplier"]),
    }),
  ),
}) satisfies z.ZodType<StockAnswer>;
