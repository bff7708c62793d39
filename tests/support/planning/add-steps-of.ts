import { parseStored } from "~/domain/stock/parse-stored";

/** The sum of decimal strings in whole millionths. */
export function addStepsOf(quantities: readonly string[]): bigint {
  return quantities.reduce((sum, quantity) => sum + parseStored(quantity), 0n);
}
