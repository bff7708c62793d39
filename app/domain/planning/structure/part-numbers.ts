/** Finds parts by the key of their part number. */
export interface PartNumbers {
  get(key: string): number | undefined;
  has(key: string): boolean;
}

/** Part number key to number, over the parts' places in the input: filling a second map would take as long again. */
export function partNumbers(given: ReadonlyMap<string, number>, numbers: Int32Array): PartNumbers {
  return {
    get(key) {
      const at = given.get(key);
      return at === undefined ? undefined : numbers[at];
    },
    has: (key) => given.has(key),
  };
}
