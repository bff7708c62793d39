import { describe, expect, test } from "vitest";
import { parseSteps, requireSteps } from "~/domain/quantity/parse-steps";

describe("parseSteps", () => {
  test.each([
    ["0", 0, 0],
    ["12", 0, 12],
    ["999999999", 0, 999_999_999],
    ["1000000000", 0, 1_000_000_000],
    ["12.00", 0, 12],
    ["0.35", 3, 350],
    ["0.350", 2, 35],
    ["7", 6, 7_000_000],
    ["9007199254740991", 0, 9_007_199_254_740_991],
    ["9007199254740992", 0, 9_007_199_254_740_992n],
    ["9007199254.740993", 6, 9_007_199_254_740_993n],
  ])("%s with %i decimals", (text, decimals, steps) => {
    expect(parseSteps(text, decimals)).toEqual({ ok: true, steps });
  });

  test.each([
    ["", 0, "not-a-number"],
    ["12a", 0, "not-a-number"],
    ["1e2", 2, "not-a-number"],
    ["-1", 0, "negative"],
    ["-0.5", 0, "negative"],
    ["0.5", 0, "too-many-decimals"],
    ["0.0001", 3, "too-many-decimals"],
  ])("refuses %s with %i decimals", (text, decimals, code) => {
    expect(parseSteps(text, decimals)).toEqual({ ok: false, code });
  });
});

test("requireSteps throws on a quantity that does not fit", () => {
  expect(requireSteps("1.5", 1)).toBe(15);
  expect(() => requireSteps("1.55", 1)).toThrow("Not a quantity with 1 decimals: 1.55 (too-many-decimals)");
});
