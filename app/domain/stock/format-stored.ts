import { formatSteps } from "~/domain/quantity/format-steps";
import { STORED_DECIMALS } from "./stored-decimals";

/**
 * Whole millionths as a decimal string with `decimals` places; with all six it is as stored. Decimals that a part
 * no longer counts in are kept, never cut off.
 */
export function formatStored(millionths: bigint, decimals: number = STORED_DECIMALS): string {
  const cut = 10n ** BigInt(STORED_DECIMALS - decimals);
  return millionths % cut === 0n
    ? formatSteps(millionths / cut, decimals)
    : formatSteps(millionths, STORED_DECIMALS);
}
