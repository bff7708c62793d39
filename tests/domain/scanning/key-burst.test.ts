import { expect, it } from "vitest";
import { addKey, isWithin, NO_BURST, scannedText } from "~/domain/scanning/key-burst";

/** Types the text with a key every so many milliseconds, then Enter. */
function typed(text: string, every: number): string | null {
  const burst = [...text].reduce((keys, key, at) => addKey(keys, key, 1000 + at * every), NO_BURST);
  return scannedText(burst, 1000 + text.length * every);
}

it("knows a scanner by its pace", () => {
  expect(typed("HB-2041", 3)).toBe("HB-2041");
  expect(typed("HB-2041", 30)).toBe("HB-2041");
});

it("leaves a person's typing alone", () => {
  expect(typed("HB-2041", 60)).toBeNull();
  expect(typed("HB-2041", 120)).toBeNull();
  expect(typed("ab", 3)).toBeNull();
  expect(scannedText(NO_BURST, 5)).toBeNull();
});

it("begins anew after a pause, and takes no Enter that comes late", () => {
  let burst = addKey(NO_BURST, "x", 0);
  burst = addKey(burst, "A", 500);
  burst = addKey(burst, "1", 505);
  burst = addKey(burst, "2", 510);
  expect(scannedText(burst, 515)).toBe("A12");
  expect(scannedText(burst, 900)).toBeNull();
  expect(isWithin(burst, 590)).toBe(true);
  expect(isWithin(burst, 591)).toBe(false);
});
