import { parseDecimal } from "./parse-decimal";
import type { Steps } from "./steps";
import { narrowSteps } from "./steps";

export type StepsProblem = "not-a-number" | "negative" | "too-many-decimals";

export type ParsedSteps = { ok: true; steps: Steps } | { ok: false; code: StepsProblem };

/**
 * A decimal quantity as whole steps of 10^-decimals. Trailing zeros are no decimals: `"0.350"` fits
 * two decimals. Nothing is ever rounded.
 */
export function parseSteps(text: string, decimals: number): ParsedSteps {
  const short = shortWhole(text);
  if (short >= 0 && decimals === 0) return { ok: true, steps: short };
  const value = parseDecimal(text);
  if (!value) return { ok: false, code: "not-a-number" };
  if (value.digits < 0n) return { ok: false, code: "negative" };
  if (value.scale > decimals) return { ok: false, code: "too-many-decimals" };
  return { ok: true, steps: narrowSteps(value.digits * 10n ** BigInt(decimals - value.scale)) };
}

/** For quantities already checked at the door; throws on one that does not fit. */
export function requireSteps(text: string, decimals: number): Steps {
  const parsed = parseSteps(text, decimals);
  if (!parsed.ok) throw new Error(`Not a quantity with ${decimals} decimals: ${text} (${parsed.code})`);
  return parsed.steps;
}

/** Up to nine plain digits as a number, else -1: most quantities, without a pattern or BigInt. */
function shortWhole(text: string): number {
  if (text.length === 0 || text.length > 9) return -1;
  let value = 0;
  for (let i = 0; i < text.length; i++) {
    const digit = text.charCodeAt(i) - 48;
    if (digit < 0 || digit > 9) return -1;
    value = value * 10 + digit;
  }
  return value;
}
