import { describe, expect, test } from "vitest";
import { divideUp } from "~/domain/quantity/divide-up";
import { formatSteps } from "~/domain/quantity/format-steps";
import { roundHalfUp } from "~/domain/quantity/round-half-up";
import { addSteps, leastSteps, narrowSteps, subtractSteps } from "~/domain/quantity/steps";

const MOST = Number.MAX_SAFE_INTEGER;
const PAST = 2n ** 53n;

describe("steps past the exact range", () => {
  test("are numbers up to 2^53 - 1, either side of nought", () => {
    expect(narrowSteps(PAST - 1n)).toBe(MOST);
    expect(narrowSteps(1n - PAST)).toBe(-MOST);
    expect(narrowSteps(PAST)).toBe(PAST);
    expect(narrowSteps(-PAST)).toBe(-PAST);
  });

  test.each([
    [1, 2, 3],
    [MOST, 0, MOST],
    [MOST, 1, PAST],
    [MOST, MOST, 2n * PAST - 2n],
    [PAST, 1, PAST + 1n],
    [PAST, -1, MOST],
    [2n, 3n, 5],
  ])("%s + %s", (a, b, sum) => {
    expect(addSteps(a, b)).toBe(sum);
    expect(addSteps(b, a)).toBe(sum);
  });

  test.each([
    [3, 5, -2],
    [PAST, 1, MOST],
    [PAST + 5n, PAST, 5],
    [1, PAST, -MOST],
  ])("%s - %s", (a, b, rest) => {
    expect(subtractSteps(a, b)).toBe(rest);
  });

  test("the smaller of two compares across forms", () => {
    expect(leastSteps(3, 5n)).toBe(3);
    expect(leastSteps(PAST, MOST)).toBe(MOST);
    expect(leastSteps(4, 4n)).toBe(4);
  });
});

test.each([
  [0n, 3n, 0n],
  [1n, 3n, 1n],
  [3n, 3n, 1n],
  [4n, 3n, 2n],
  [10n ** 30n + 1n, 10n, 10n ** 29n + 1n],
])("%s / %s rounded up", (a, b, up) => {
  expect(divideUp(a, b)).toBe(up);
});

test.each([
  [350, 3, "0.350"],
  [350, 0, "350"],
  [0, 2, "0.00"],
  [5, 2, "0.05"],
  [12345, 2, "123.45"],
  [-5, 2, "-0.05"],
  [-12345n, 1, "-1234.5"],
  [PAST, 6, "9007199254.740992"],
])("%s steps of %i decimals read %s", (steps, decimals, text) => {
  expect(formatSteps(steps, decimals)).toBe(text);
});

test.each([
  [{ digits: 1005n, scale: 3 }, 2, "1.01"],
  [{ digits: 1004n, scale: 3 }, 2, "1.00"],
  [{ digits: 10049999n, scale: 7 }, 2, "1.00"],
  [{ digits: 5n, scale: 1 }, 0, "1"],
  [{ digits: 49n, scale: 2 }, 0, "0"],
  [{ digits: 7n, scale: 0 }, 2, "7.00"],
  [{ digits: 995n, scale: 3 }, 2, "1.00"],
])("%o to %i places is %s", (value, places, text) => {
  expect(roundHalfUp(value, places)).toBe(text);
});
