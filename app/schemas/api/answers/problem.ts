import { z } from "zod";

/** What is wrong, as RFC 9457 describes it. */
export const problemAnswer = z.object({
  type: z.string(),
  title: z.string(),
  status: z.int(),
  detail: z.string(),
  errors: z
    .array(
      z.object({
        field: z.string().optional(),
        line: z.int().optional(),
        column: z.string().optional(),
        value: z.string().optional(),
        unknownHeader: z.literal(true).optional(),
        message: z.string(),
      }),
    )
    .optional(),
  requestId: z.string().optional(),
});
