import { requireDecimal } from "../../quantity/parse-decimal";
import { requireSteps } from "../../quantity/parse-steps";
import type { Ratio } from "./structure";

/**
 * Component steps for each parent step: quantity / (1 - scrap), with both parts' decimals taken in.
 * Scrap is a decimal of at least 0 and below 1. The ratio is in lowest terms.
 */
export function lineRatio(
  quantity: string,
  scrap: string,
  componentDecimals: number,
  parentDecimals: number,
): Ratio {
  const perParent = BigInt(requireSteps(quantity, componentDecimals));
  const loss = requireDecimal(scrap);
  const whole = 10n ** BigInt(loss.scale);
  return reduce(perParent * whole, 10n ** BigInt(parentDecimals) * (whole - loss.digits));
}

/** What to start for each good one: 1 / yield, in lowest terms. */
export function yieldRatio(yieldText: string): Ratio {
  const good = requireDecimal(yieldText);
  return reduce(10n ** BigInt(good.scale), good.digits);
}

function reduce(num: bigint, den: bigint): Ratio {
  if (num === 0n) return { num: 0n, den: 1n };
  let a = num;
  let b = den;
  while (b !== 0n) [a, b] = [b, a % b];
  return { num: num / a, den: den / a };
}
