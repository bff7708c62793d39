import { z } from "zod";
import type { EffectsAnswer } from "~/schemas/planning/effects";
import { shipLineState } from "./ship-line";
import { count, dayText, missingPart } from "./values";

const plannedKitOrder = z.object({
  kitOrder: z.string(),
  partNumber: z.string(),
  isReady: z.boolean(),
  stoppers: z.array(missingPart),
  readyOn: dayText,
});

const ownKitOrder = z.object({
  kitOrder: z.string(),
  place: z.int().min(1),
  planned: plannedKitOrder.nullable(),
});

export const effectsAnswer = z.object({
  today: dayText,
  revision: count,
  before: shipLineState,
  after: shipLineState,
  becomeReady: z.array(z.string()),
  stop: z.array(plannedKitOrder),
  own: z.array(ownKitOrder),
}) satisfies z.ZodType<EffectsAnswer>;
