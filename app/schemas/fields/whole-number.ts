import { z } from "zod";

/** A whole number in plain digits between two bounds. */
export function wholeNumber(from: number, to: number) {
  return z.string().transform((text, ctx) => {
    const trimmed = text.trim();
    const value = /^\d{1,15}$/.test(trimmed) ? Number(trimmed) : Number.NaN;
    if (value >= from && value <= to) return value;
    ctx.addIssue({ code: "custom", message: `a whole number from ${from} to ${to}`, input: text });
    return z.NEVER;
  });
}
