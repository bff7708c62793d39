import { z } from "zod";
import { partNumber } from "~/schemas/fields/part-number";
import { code } from "~/schemas/fields/text";

/** The query of `GET /api/movements`: `after` is the `next` of the page before. */
export const movementsQuerySchema = z.object({
  partNumber: partNumber.optional(),
  after: z
    .string()
    .regex(/^\d{1,15}$/, "Send as after what the page before gave as next.")
    .transform(Number)
    .optional(),
});

/** The query of `GET /api/stock`. */
export const stockQuerySchema = z.object({
  partNumber: partNumber.optional(),
  bin: code("a bin code").optional(),
});
