import { expect, test } from "vitest";
import { sortWorstFirst } from "~/domain/planning/answer/sort-worst-first";
import { sumCost } from "~/domain/planning/answer/sum-cost";
import { compileStructure } from "~/domain/planning/compile-structure";
import { buildPart } from "../../../support/planning/factories";

const compiled = compileStructure(
  [
    buildPart({ partNumber: "A", unitCost: "0.005" }),
    buildPart({ partNumber: "B", unitCost: "1.10", decimals: 2 }),
    buildPart({ partNumber: "C" }),
    buildPart({ partNumber: "D", unitCost: "1.1" }),
  ],
  [],
);
if (!compiled.ok) throw new Error("These parts can be planned.");
const { structure } = compiled;

test.each([
  [[], "0.00"],
  [[[0, 1]], "0.01"],
  [[[0, 3]], "0.02"],
  [[[1, 50]], "0.55"],
  [[[2, 1000]], "0.00"],
  [
    [
      [0, 1],
      [1, 150],
      [3, 2],
    ],
    "3.86",
  ],
  [[[3, 10n ** 20n]], "110000000000000000000.00"],
])("%s costs %s", (amounts, cost) => {
  const short = (amounts as [number, number | bigint][]).map(([part, short]) => ({ part, short }));
  expect(sumCost(structure, short)).toBe(cost);
});

test.each([
  [
    "the latest day",
    [
      [0, 10, 1],
      [3, 20, 1],
    ],
    [3, 0],
  ],
  [
    "then the dearest, by steps of the part",
    [
      [1, 10, 100],
      [3, 10, 2],
      [0, 10, 1],
    ],
    [3, 1, 0],
  ],
  [
    "then the part number",
    [
      [3, 10, 1],
      [1, 10, 100],
    ],
    [1, 3],
  ],
  [
    "a part without a cost last",
    [
      [2, 10, 900],
      [0, 10, 1],
    ],
    [0, 2],
  ],
])("worst first: %s", (_, given, order) => {
  const stoppers = given.map(([part, readyOn, short]) => ({ part, readyOn, short }));
  const before = [...stoppers];
  expect(sortWorstFirst(structure, stoppers).map(({ part }) => part)).toEqual(order);
  expect(stoppers).toEqual(before);
});
