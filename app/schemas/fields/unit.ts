import { z } from "zod";

/** A unit by its UN/CEFACT Recommendation 20 code (or 21 for a packaging): EA, MTR, KGM, XRO. */
export const unit = z
  .string()
  .transform((text) => text.trim())
  .refine((text) => /^[A-Z0-9]{1,3}$/.test(text), "a UN/CEFACT unit code such as EA, MTR or KGM");
