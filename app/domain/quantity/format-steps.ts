import type { Steps } from "./steps";

/** Whole steps as a decimal string with all the part's decimals: 350 steps at 3 decimals is `"0.350"`. */
export function formatSteps(steps: Steps, decimals: number): string {
  if (decimals === 0) return steps.toString();
  const negative = steps < 0;
  const digits = (negative ? -BigInt(steps) : BigInt(steps)).toString().padStart(decimals + 1, "0");
  const point = digits.length - decimals;
  return `${negative ? "-" : ""}${digits.slice(0, point)}.${digits.slice(point)}`;
}
