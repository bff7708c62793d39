import type { PartIndex } from "./part-index";

/** Finds parts by the key of their part number. */
export interface PartNumbers {
  get(key: string): number | undefined;
  has(key: string): boolean;
}

/** Part number key to number, by way of the parts' places in the input. */
export function partNumbers(given: PartIndex, numbers: Int32Array): PartNumbers {
  const get = (key: string) => {
    const at = given.find(key);
    return at < 0 ? undefined : numbers[at];
  };
  return { get, has: (key) => get(key) !== undefined };
}
