import { describe, expect, test } from "vitest";
import { alignOnPoint } from "~/utils/format/align-on-point";
import { daysBetween, formatDate } from "~/utils/format/format-date";
import { formatMoney } from "~/utils/format/format-money";
import { formatNumber } from "~/utils/format/format-number";
import { formatQuantity } from "~/utils/format/format-quantity";
import { cardinal, ordinal, sentenceCase } from "~/utils/format/number-words";
import { unitSymbol } from "~/utils/format/unit-symbol";
import { readTheme } from "~/utils/read-theme";

describe("dates", () => {
  test.each([
    ["2026-12-24", "24 December"],
    ["2026-01-02", "2 January"],
    ["2027-03-14", "14 March"],
    ["2027-09-27", "27 September"],
    ["2027-09-28", "28 September 2027"],
    ["2025-12-31", "31 December 2025"],
  ])("%s seen on 1 December 2026 is %s", (iso, words) => {
    expect(formatDate(iso, { today: "2026-12-01" })).toBe(words);
  });

  test("are short in tables and whole without a today", () => {
    expect(formatDate("2027-03-04", { today: "2026-12-01", short: true })).toBe("4 Mar");
    expect(formatDate("2027-03-04")).toBe("4 March 2027");
  });

  test("count whole days, also over the change of clocks", () => {
    expect(daysBetween("2027-03-27", "2027-03-29")).toBe(2);
    expect(daysBetween("2027-03-14", "2027-03-13")).toBe(-1);
  });
});

test.each([
  ["0", "0"],
  ["999", "999"],
  ["1000", "1,000"],
  ["1234567.8901", "1,234,567.8901"],
  ["-1234", "−1,234"],
  ["90071992547409921234", "90,071,992,547,409,921,234"],
])("%s is written %s", (text, written) => {
  expect(formatNumber(text)).toBe(written);
});

test.each([
  ["12", 0, "12"],
  ["0.35", 3, "0.350"],
  ["1404.000000", 0, "1,404"],
  ["2.500000", 1, "2.5"],
  ["0", 2, "0.00"],
])("%s with %i decimals is written %s", (quantity, decimals, written) => {
  expect(formatQuantity(quantity, decimals)).toBe(written);
});

test.each([
  ["1731.85", "1,731.85"],
  ["0", "0.00"],
  ["0.005", "0.01"],
  ["9.994999", "9.99"],
  ["999.995", "1,000.00"],
  ["-0.5", "−0.50"],
  ["123456789012345678.10", "123,456,789,012,345,678.10"],
])("%s in money is %s", (amount, written) => {
  expect(formatMoney(amount)).toBe(written);
});

test("numbers in words go to twelve", () => {
  expect([0, 1, 12, 13, 1250].map(cardinal)).toEqual(["none", "one", "twelve", "13", "1,250"]);
  expect([1, 8, 12, 13, 21, 22, 33, 111, 1001].map(ordinal)).toEqual(
    "first eighth twelfth 13th 21st 22nd 33rd 111th 1,001st".split(" "),
  );
  expect(sentenceCase("eighth")).toBe("Eighth");
});

test("figures in a column have their points in line", () => {
  expect(alignOnPoint(["1,404", "0.350", "2.5"])).toEqual([
    "1,404\u00a0\u00a0\u00a0\u00a0",
    "0.350",
    "2.5\u00a0\u00a0",
  ]);
  expect(alignOnPoint([])).toEqual([]);
});

test("units have their symbol, pieces none, unknown ones their code", () => {
  expect(["KGM", "EA", "XRO", "constructor"].map(unitSymbol)).toEqual(["kg", "", "XRO", "constructor"]);
});

test("the theme is read from its cookie only", () => {
  expect(readTheme("a=1; theme=dark")).toBe("dark");
  expect(readTheme("theme=light; b=2")).toBe("light");
  expect(readTheme("mytheme=dark; theme=blue")).toBeUndefined();
  expect(readTheme(null)).toBeUndefined();
});
