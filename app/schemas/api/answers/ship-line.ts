import { z } from "zod";
import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { count, dayText, missingPart } from "./values";

/** The open kit orders at one moment. */
export const shipLineState = z.object({
  ready: count,
  of: count,
  next: z.object({ kitOrder: z.string(), partNumber: z.string(), stoppers: z.array(missingPart) }).nullable(),
  allBy: dayText.nullable(),
});

export const shipLineAnswer = shipLineState.extend({ revision: count }) satisfies z.ZodType<ShipLineAnswer>;
