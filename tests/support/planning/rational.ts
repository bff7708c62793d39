/** An exact fraction; the denominator is above 0. */
export interface Rational {
  over: bigint;
  under: bigint;
}

/** Reads decimal digits with an optional point. */
export function rational(text: string): Rational {
  const [whole, fraction = ""] = text.split(".");
  return { over: BigInt(whole + fraction), under: 10n ** BigInt(fraction.length) };
}

export function times(a: Rational, b: Rational): Rational {
  return { over: a.over * b.over, under: a.under * b.under };
}

export function dividedBy(a: Rational, b: Rational): Rational {
  return { over: a.over * b.under, under: a.under * b.over };
}

export function oneMinus(a: Rational): Rational {
  return { over: a.under - a.over, under: a.under };
}

export function wholeNumber(value: bigint): Rational {
  return { over: value, under: 1n };
}

/** The smallest whole number that is not below a fraction of 0 or more. */
export function ceiling(a: Rational): bigint {
  return (a.over + a.under - 1n) / a.under;
}

export function tenTo(exponent: number): Rational {
  return wholeNumber(10n ** BigInt(exponent));
}

/** A decimal string as whole steps of 10^-decimals. */
export function toSteps(text: string, decimals: number): bigint {
  const value = times(rational(text), tenTo(decimals));
  if (value.over % value.under !== 0n) throw new Error(`${text} has more than ${decimals} decimals`);
  return value.over / value.under;
}

/** Whole steps as a decimal string with all of the part's decimals. */
export function toText(steps: bigint, decimals: number): string {
  const digits = steps.toString().padStart(decimals + 1, "0");
  return decimals === 0 ? digits : `${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`;
}

export function smaller(a: bigint, b: bigint): bigint {
  return a < b ? a : b;
}
