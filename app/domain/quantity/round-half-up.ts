import { formatSteps } from "./format-steps";
import type { Decimal } from "./parse-decimal";

/** A decimal of at least 0 with the given number of places, rounded once, half up. */
export function roundHalfUp(value: Decimal, places: number): string {
  if (value.scale <= places) return formatSteps(value.digits * 10n ** BigInt(places - value.scale), places);
  const unit = 10n ** BigInt(value.scale - places);
  return formatSteps((value.digits * 2n + unit) / (unit * 2n), places);
}
