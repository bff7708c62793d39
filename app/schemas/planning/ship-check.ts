import { z } from "zod";
import { optionCodes } from "~/schemas/fields/option-codes";

const wholeKits = z
  .string({ error: "Say how many kits: a whole number above 0, such as 10." })
  .regex(/^0*[1-9]\d{0,11}$/, "Give a whole number of kits above 0, such as 10.")
  .transform((text) => String(Number(text)));

/** The query of `GET /api/ship-check`. */
export const shipCheckQuerySchema = z.object({
  kit: z
    .string({ error: "Say which kit: kit=PART-NUMBER." })
    .trim()
    .min(1, "Say which kit: kit=PART-NUMBER.")
    .max(120),
  quantity: wholeKits,
  by: z.iso.date({ error: "Give the date as year-month-day, such as 2027-03-14." }).optional(),
  options: z
    .string()
    .optional()
    .transform((text) => (text ?? "").replaceAll(",", "+"))
    .pipe(optionCodes),
});
