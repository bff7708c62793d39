import { formatNumber } from "./format-number";

/** A decimal string in the shop's currency to two decimals, half away from zero: `1,731.85`. */
export function formatMoney(amount: string): string {
  const [, sign, whole, fraction = ""] = /^([-+]?)(\d+)(?:\.(\d+))?$/.exec(amount) ?? [];
  if (whole === undefined) return amount;
  const cents =
    BigInt(whole + fraction.padEnd(2, "0").slice(0, 2)) + (Number(fraction[2] ?? 0) >= 5 ? 1n : 0n);
  const digits = cents.toString().padStart(3, "0");
  return formatNumber(`${sign}${digits.slice(0, -2)}.${digits.slice(-2)}`);
}
