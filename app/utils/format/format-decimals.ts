import { trimDecimal } from "./trim-decimal";

/** A DECIMAL with just so many decimals: `"0.350000"` at 3 is `"0.350"`. Never drops a digit that says something. */
export function formatDecimals(text: string, decimals: number): string {
  const [whole, fraction = ""] = trimDecimal(text).split(".");
  const padded = fraction.padEnd(decimals, "0");
  return padded === "" ? whole : `${whole}.${padded}`;
}
