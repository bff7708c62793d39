import { z } from "zod";

const plain = /^\d+(\.\d+)?$/;
const mostDigits = 30;
const mostDecimals = 6;

/** Says what is wrong with a text that is no plain quantity; null where it is one. */
function quantityFault(text: string): string | null {
  const example = "such as 12 or 0.350";
  if (text === "") return `a quantity ${example}`;
  if (plain.test(text)) {
    const [whole, fraction = ""] = text.split(".");
    if (whole.length > mostDigits) return `a quantity of at most ${mostDigits} digits`;
    const decimals = fraction.replace(/0+$/, "").length;
    return decimals > mostDecimals ? `a quantity with at most ${mostDecimals} decimals` : null;
  }
  if (/^-/.test(text)) return "a quantity of 0 or more, not negative";
  if (/^[+]/.test(text)) return `a quantity in plain digits without a sign, ${example}`;
  if (/^[\d.,]+e[+-]?\d+$/i.test(text)) return `a quantity in plain digits without an exponent, ${example}`;
  if (/^[\d.,'’\s\u00a0\u202f]+$/.test(text)) {
    return `a quantity in plain digits without thousands separators and with a decimal point, ${example}`;
  }
  if (/^(nan|inf(inity)?|∞)$/i.test(text)) return `a finite quantity in plain digits, ${example}`;
  return `a quantity in plain digits, ${example}`;
}

/** The same decimal without the zeros that say nothing: `007.50` is `7.5`. */
export function plainDecimal(text: string): string {
  const [whole, fraction = ""] = text.split(".");
  const kept = fraction.replace(/0+$/, "");
  const digits = whole.replace(/^0+(?=\d)/, "");
  return kept === "" ? digits : `${digits}.${kept}`;
}

/** A quantity as plain decimal digits: `"12"`, `"0.350"`. No sign, exponent, word or separator. */
export const quantity = z.string().transform((text, ctx) => {
  const trimmed = text.trim();
  const message = quantityFault(trimmed);
  if (message === null) return plainDecimal(trimmed);
  ctx.addIssue({ code: "custom", message, input: text });
  return z.NEVER;
});

/** A quantity above 0. */
export const positiveQuantity = quantity.refine((text) => /[1-9]/.test(text), "a quantity above 0");
