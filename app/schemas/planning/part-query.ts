import { z } from "zod";

const MOST_A_PAGE = 500;

/** A whole number from an address, with a sentence of its own where it is none. */
function wholeNumber(least: number, most: number, fallback: number) {
  const sentence = `Give a whole number from ${least} to ${most}.`;
  return z
    .string()
    .regex(/^\d{1,9}$/, sentence)
    .default(String(fallback))
    .transform(Number)
    .pipe(z.number().min(least, sentence).max(most, sentence));
}

/** The query of `GET /api/parts`. */
export const partsQuerySchema = z.object({
  q: z.string().trim().max(200, "Search for at most 200 characters.").default(""),
  page: wholeNumber(1, 1_000_000, 1),
  size: wholeNumber(1, MOST_A_PAGE, 50),
});

/** The query of `GET /api/structure/:partNumber`. */
export const structureQuerySchema = z.object({ levels: wholeNumber(1, 100, 100) });
