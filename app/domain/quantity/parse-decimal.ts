/** `digits / 10^scale`, exactly. */
export interface Decimal {
  digits: bigint;
  scale: number;
}

const PLAIN = /^(-?)(\d+)(?:\.(\d+))?$/;

/**
 * Reads plain decimal digits with an optional sign and point. Exponents, words, separators and a bare
 * point are no decimal: the answer is null.
 */
export function parseDecimal(text: string): Decimal | null {
  const match = PLAIN.exec(text);
  if (!match) return null;
  const fraction = (match[3] ?? "").replace(/0+$/, "");
  const digits = BigInt(match[2] + fraction);
  return { digits: match[1] ? -digits : digits, scale: fraction.length };
}

/** For values already checked at the door; throws on anything that is no decimal. */
export function requireDecimal(text: string): Decimal {
  const value = parseDecimal(text);
  if (!value) throw new Error(`Not a decimal: ${text}`);
  return value;
}
