import { z } from "zod";

/** Decimal digits with an optional point, never a float. */
export const decimalText = z.string().regex(/^-?\d+(\.\d+)?$/);

export const dayText = z.iso.date();

export const sourcing = z.enum(["buy", "make", "phantom"]);

export const count = z.int().min(0);

export const missingPart = z.object({ partNumber: z.string(), missing: decimalText });
