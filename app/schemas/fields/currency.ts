import { z } from "zod";

/** An ISO 4217 currency code. */
export const currency = z
  .string()
  .transform((text) => text.trim())
  .refine((text) => /^[A-Z]{3}$/.test(text), "a currency code of three capital letters such as EUR");
