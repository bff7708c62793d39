import { z } from "zod";
import { isIsoDate } from "./iso-date";

const shape = /^(\d{4}-\d{2}-\d{2})T([01]\d|2[0-3]):[0-5]\d(:[0-5]\d(\.\d{1,3})?)?(Z|[+-]\d{2}:\d{2})$/;

/** A moment with its offset from UTC. */
export const moment = z
  .string()
  .transform((text) => text.trim())
  .refine((text) => isIsoDate(shape.exec(text)?.[1] ?? ""), "a moment such as 2026-12-01T09:30:00Z");
