import { z } from "zod";
import type { BalanceState, MovementKind, PostedKind } from "~/domain/stock/types";

export const balanceState = z.enum([
  "usable",
  "held",
  "staged",
  "with-supplier",
]) satisfies z.ZodType<BalanceState>;

export const postedKind = z.enum([
  "receive",
  "return",
  "issue",
  "scrap",
  "move",
  "hold",
  "release",
  "adjust",
]) satisfies z.ZodType<PostedKind>;

export const movementKind = z.enum([...postedKind.options, "reverse"]) satisfies z.ZodType<MovementKind>;
