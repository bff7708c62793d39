import { describe, expect, test } from "vitest";
import { parseDecimal, requireDecimal } from "~/domain/quantity/parse-decimal";

describe("parseDecimal", () => {
  test.each([
    ["0", 0n, 0],
    ["12", 12n, 0],
    ["0.350", 35n, 2],
    ["-1.05", -105n, 2],
    ["007", 7n, 0],
    ["5.000", 5n, 0],
    ["123456789012345678901234.5", 1234567890123456789012345n, 1],
  ])("reads %s", (text, digits, scale) => {
    expect(parseDecimal(text)).toEqual({ digits, scale });
  });

  test.each(["", " ", "1e3", ".5", "5.", "1,000", "+1", "--1", "0x10", "NaN", "Infinity", "1 ", "٣"])(
    "says that %j is none",
    (text) => {
      expect(parseDecimal(text)).toBeNull();
    },
  );
});

test("requireDecimal names what is no decimal", () => {
  expect(requireDecimal("1.5")).toEqual({ digits: 15n, scale: 1 });
  expect(() => requireDecimal("many")).toThrow("Not a decimal: many");
});
