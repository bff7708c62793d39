import { formatNumber } from "./format-number";

/** `0.35` with three decimals to `0.350`: every quantity of a part shows the part's decimals, so that points line up. */
export function formatQuantity(quantity: string, decimals: number): string {
  const [whole, fraction = ""] = quantity.split(".");
  const kept = fraction.replace(/0+$/, "").padEnd(decimals, "0");
  return formatNumber(kept === "" ? whole : `${whole}.${kept}`);
}
