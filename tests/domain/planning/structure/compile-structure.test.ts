import { describe, expect, test } from "vitest";
import { compileStructure } from "~/domain/planning/compile-structure";
import { countReached } from "~/domain/planning/count-reached";
import type { PlanLine, PlanPart } from "~/domain/planning/types";
import { buildLine, buildPart } from "../../../support/planning/factories";

function compile(parts: PlanPart[], lines: PlanLine[]) {
  const compiled = compileStructure(parts, lines);
  if (!compiled.ok) throw new Error(JSON.stringify(compiled.problems));
  return compiled.structure;
}

function problems(parts: PlanPart[], lines: PlanLine[]) {
  const compiled = compileStructure(parts, lines);
  return compiled.ok ? [] : compiled.problems;
}

const make = (partNumber: string, rest: Partial<PlanPart> = {}) =>
  buildPart({ partNumber, sourcing: "make", ...rest });
const buy = (partNumber: string, rest: Partial<PlanPart> = {}) => buildPart({ partNumber, ...rest });
const line = (parent: string, component: string, rest: Partial<PlanLine> = {}) =>
  buildLine({ parent, component, ...rest });

describe("numbers", () => {
  const structure = compile(
    [buy("BOLT", { leadTimeDays: 5 }), make("SUB", { decimals: 2 }), make("KIT")],
    [line("KIT", "BOLT"), line("SUB", "BOLT", { quantity: "3" }), line("KIT", "SUB", { quantity: "0.5" })],
  );
  const number = (partNumber: string) => structure.numberOf.get(partNumber) as number;

  test("parents come first, and every array goes by the new numbers", () => {
    expect(structure.parts.map((part) => part.partNumber)).toEqual(["KIT", "SUB", "BOLT"]);
    expect([...structure.level]).toEqual([0, 1, 2]);
    expect([...structure.leaf]).toEqual([0, 0, 1]);
    expect([...structure.decimals]).toEqual([0, 2, 0]);
    expect([...structure.leadTime]).toEqual([0, 0, 5]);
    expect([number("KIT"), number("SUB"), number("BOLT")]).toEqual([0, 1, 2]);
    expect(structure.numberOf.has("NUT")).toBe(false);
    expect(structure.numberOf.get("NUT")).toBeUndefined();
  });

  test("lines stand by their parent in the order given, with whole ratios", () => {
    const { starts, component, source, num, den } = structure.fixed;
    expect([...starts]).toEqual([0, 2, 3, 3]);
    expect([...component]).toEqual([2, 1, 2]);
    expect([...source]).toEqual([0, 2, 1]);
    expect([...num].map((top, at) => top / den[at])).toEqual([1, 50, 0.03]);
  });

  test("all below a part are counted once", () => {
    expect(countReached(structure, number("KIT"))).toBe(2);
    expect(countReached(structure, number("SUB"))).toBe(1);
    expect(countReached(structure, number("BOLT"))).toBe(0);
  });
});

test.each([
  ["1", "0", 0, 0, 1, 1],
  ["999999", "0", 0, 0, 999_999, 1],
  ["1234567", "0", 0, 0, 1_234_567, 1],
  ["2.0", "0", 0, 0, 2, 1],
  ["1", "0.1", 0, 0, 10, 9],
  ["0.25", "0", 2, 0, 25, 1],
  ["1", "0", 0, 2, 1, 100],
  ["0", "0.5", 0, 0, 0, 1],
])("quantity %s, scrap %s, decimals %i and %i: %i/%i", (quantity, scrap, own, parents, num, den) => {
  const { fixed } = compile(
    [make("K", { decimals: parents }), buy("A", { decimals: own })],
    [line("K", "A", { quantity, scrap })],
  );
  expect([fixed.num[0], fixed.den[0]]).toEqual([num, den]);
});

test("a ratio past 2^53 is kept aside, exactly", () => {
  const { fixed } = compile([make("K"), buy("A")], [line("K", "A", { quantity: "9007199254740993" })]);
  expect(fixed.num[0]).toBe(Number.POSITIVE_INFINITY);
  expect(fixed.wide.get(0)).toEqual({ num: 9_007_199_254_740_993n, den: 1n });
});

test("a yield counts for made parts alone", () => {
  const structure = compile([make("K", { yield: "0.8" }), buy("A", { yield: "0.5" })], [line("K", "A")]);
  expect([...structure.yieldNum]).toEqual([5, 1]);
  expect([...structure.yieldDen]).toEqual([4, 1]);
});

describe("kinds of lines", () => {
  const parts = [make("K"), buildPart({ partNumber: "PH", sourcing: "phantom" }), buy("A")];

  test("conditions and quantities sort them", () => {
    const structure = compile(parts, [
      line("K", "PH", { option: "CAB" }),
      line("K", "A", { quantity: null }),
      line("PH", "A", { fromSerial: "010" }),
      line("PH", "A", { quantity: null, option: "CAB" }),
      line("K", "A"),
    ]);
    expect([...structure.fixed.source]).toEqual([4]);
    expect([...structure.conditional.source]).toEqual([0, 2]);
    expect([...structure.asRequired.source]).toEqual([1, 3]);
    expect([...structure.openParts]).toEqual([0, 1]);
  });

  test.each([
    [{ option: "CAB" }, "option"],
    [{ fromSerial: "010" }, "from_serial"],
    [{ toSerial: "010" }, "to_serial"],
    [{ fromDate: "2027-01-01" }, "from_date"],
    [{ toDate: "2027-01-01" }, "to_date"],
    [{ quantity: null, option: "CAB" }, "option"],
  ])("%o may not stand below a made part of a kit", (condition, column) => {
    const found = problems([...parts, make("SUB")], [line("K", "SUB"), line("SUB", "A", condition)]);
    expect(found).toEqual([{ code: "condition-not-allowed", line: 1, column, parent: "SUB" }]);
  });

  test("a phantom used elsewhere too is closed", () => {
    const lines = [line("K", "PH"), line("K", "SUB"), line("SUB", "PH"), line("PH", "A", { option: "CAB" })];
    expect(problems([...parts, make("SUB")], lines)).toMatchObject([{ line: 3, parent: "PH" }]);
  });
});

describe("what cannot be planned", () => {
  test("a part that is not there, by line and column", () => {
    expect(problems([make("K")], [line("K", "A"), line("X", "K")])).toEqual([
      { code: "unknown-part", line: 0, column: "component", partNumber: "A" },
      { code: "unknown-part", line: 1, column: "parent", partNumber: "X" },
    ]);
  });

  test("every part that stands there twice, however it is written", () => {
    expect(problems([buy("a-1"), buy("B"), buy(" A-1 "), buy("B")], [])).toEqual([
      { code: "duplicate-part", part: 2, partNumber: " A-1 " },
      { code: "duplicate-part", part: 3, partNumber: "B" },
    ]);
  });

  test("a loop, whole, from its smallest part number", () => {
    const lines = [line("C", "A"), line("A", "B"), line("B", "C"), line("K", "A")];
    expect(problems([make("K"), make("C"), make("B"), make("A")], lines)).toEqual([
      { code: "loop", line: 2, loop: ["A", "B", "C", "A"] },
    ]);
  });

  test("no more than a hundred at once", () => {
    const lines = Array.from({ length: 300 }, () => line("K", "?"));
    expect(problems([make("K")], lines)).toHaveLength(100);
  });
});
