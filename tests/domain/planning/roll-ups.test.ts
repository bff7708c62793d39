import { describe, expect, test } from "vitest";
import { compileStructure } from "~/domain/planning/compile-structure";
import { rollUpCost } from "~/domain/planning/roll-up-cost";
import { rollUpMass } from "~/domain/planning/roll-up-mass";
import type { PlanPart } from "~/domain/planning/types";
import { buildShop, TODAY } from "../../support/planning/factories";

function structureOf(text: string, parts: Record<string, Partial<PlanPart>>) {
  const shop = buildShop(text, { parts });
  const lines = shop.lines.map((line) => (line.component === "heater" ? { ...line, option: "HEAT" } : line));
  const compiled = compileStructure(shop.parts, lines);
  if (!compiled.ok) throw new Error(JSON.stringify(compiled.problems));
  return compiled.structure;
}

const TEXT = `
  kit = 2 hull + 1.5 rope + 1 heater
  hull = 4 bolt + 1 frame`;

describe("rollUpMass", () => {
  const structure = structureOf(TEXT, {
    rope: { decimals: 1, massKg: "0.02" },
    bolt: { massKg: "0.0125" },
    frame: { massKg: "3" },
    heater: { massKg: "1.5" },
  });

  test.each([
    ["bolt", "0.0125", "its own"],
    ["hull", "3.05", "its components'"],
    ["kit", "6.13", "all levels', decimals of a unit too"],
  ])("%s weighs %s: %s", (part, massKg) => {
    const mass = rollUpMass(structure, part, (line) => line.option === null);
    expect(mass).toEqual({ massKg, unknown: [] });
  });

  test("lines that count add to it", () => {
    expect(rollUpMass(structure, "kit", () => true)?.massKg).toBe("7.63");
  });

  test("a made part's own mass stands in for what is below it, unknown or not", () => {
    const other = structureOf(TEXT, {
      hull: { massKg: "2" },
      heater: { massKg: "1" },
      rope: { decimals: 1 },
    });
    const mass = rollUpMass(other, "KIT", () => true);
    expect(mass).toEqual({ massKg: "5", unknown: ["rope"] });
  });

  test("there is none of a part that is not there", () => {
    expect(rollUpMass(structure, "boat", () => true)).toBeNull();
  });
});

describe("rollUpCost", () => {
  const structure = structureOf(TEXT, {
    rope: { decimals: 1, unitCost: "2.25" },
    bolt: { unitCost: "0.055" },
    frame: { unitCost: "10" },
    heater: { unitCost: "99.99" },
    hull: { yield: "0.8" },
  });

  test.each([
    ["bolt", [], "0.06"],
    // 1 / 0.8 starts two hulls for one.
    ["hull", [], "20.44"],
    // Two hulls start three.
    ["kit", [], "34.04"],
    ["kit", ["HEAT"], "134.03"],
  ])("%s with %j costs %s", (part, options, cost) => {
    expect(rollUpCost(structure, part, options, TODAY)).toBe(cost);
  });

  test("there is none of a part or an option that is not there", () => {
    expect(rollUpCost(structure, "boat", [], TODAY)).toBeNull();
    expect(rollUpCost(structure, "kit", ["SAIL"], TODAY)).toBeNull();
  });
});
