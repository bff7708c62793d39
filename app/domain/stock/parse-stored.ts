import { requireDecimal } from "~/domain/quantity/parse-decimal";
import { STORED_DECIMALS } from "./stored-decimals";

/** A stored quantity with its sign as whole millionths: `"-0.350000"` is -350000. */
export function parseStored(text: string): bigint {
  const { digits, scale } = requireDecimal(text);
  return digits * 10n ** BigInt(STORED_DECIMALS - scale);
}
