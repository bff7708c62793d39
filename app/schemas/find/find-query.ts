import { z } from "zod";

/** The query of `GET /api/find` and of the page Find. */
export const findQuerySchema = z.object({
  q: z.string().trim().max(200, "Search for at most 200 characters.").default(""),
});
