import { z } from "zod";
import { plainDecimal } from "./quantity";

const plain = /^\d+(\.\d+)?$/;
const longestFraction = 32;

function fraction(expected: string, accepts: (text: string) => boolean) {
  return z.string().transform((text, ctx) => {
    const trimmed = text.trim();
    if (trimmed.length <= longestFraction && plain.test(trimmed) && accepts(trimmed))
      return plainDecimal(trimmed);
    ctx.addIssue({ code: "custom", message: expected, input: text });
    return z.NEVER;
  });
}

const isBelowOne = (text: string) => /^0+(\.|$)/.test(text);
const isOne = (text: string) => /^0*1(\.0*)?$/.test(text);
const isZero = (text: string) => !/[1-9]/.test(text);

/** The part of a line that is lost: 0 to below 1. */
export const scrapFraction = fraction("a fraction from 0 to below 1, such as 0.02 for 2 %", isBelowOne);

/** The good part of what is started: above 0, at most 1. */
export const yieldFraction = fraction(
  "a fraction above 0 and at most 1, such as 0.85 for 85 %",
  (text) => isOne(text) || (isBelowOne(text) && !isZero(text)),
);
