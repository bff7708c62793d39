import { expect, test } from "vitest";
import { splitPromised } from "~/domain/planning/split-promised";
import { buildStock } from "../../support/planning/factories";

const early = buildStock("A", "5", { expiresOn: "2027-01-01" });
const late = buildStock("A", "5", { expiresOn: "2027-06-01" });
const never = buildStock("A", "2.5");
const other = buildStock("B", "7");

test.each([
  ["0", []],
  ["1", [[null, "1"]]],
  ["2.5", [[null, "2.5"]]],
  [
    "4.75",
    [
      [null, "2.5"],
      ["2027-06-01", "2.25"],
    ],
  ],
  [
    "7.5",
    [
      [null, "2.5"],
      ["2027-06-01", "5"],
    ],
  ],
  [
    "99",
    [
      [null, "2.5"],
      ["2027-06-01", "5"],
      ["2027-01-01", "5"],
    ],
  ],
])("%s promised of lots that expire last first", (promised, expected) => {
  const split = splitPromised([early, other, never, late], [{ partNumber: "a", quantity: promised }]);
  const kept = split.filter((row) => row.nowOnly);
  expect(kept.map(({ expiresOn, quantity }) => [expiresOn, quantity])).toEqual(expected);
  const total = (partNumber: string) =>
    split.reduce((sum, row) => (row.partNumber === partNumber ? sum + Number(row.quantity) : sum), 0);
  expect([total("A"), total("B")]).toEqual([12.5, 7]);
  expect(split.every((row) => Number(row.quantity) > 0)).toBe(true);
});
