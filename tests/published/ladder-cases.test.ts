import { describe, expect, test } from "vitest";
import {
  buildDemand,
  buildLine,
  buildPart,
  buildShop,
  buildStock,
  buildSupply,
  type Shop,
} from "../support/planning/factories";
import { runCore } from "../support/planning/run-core";

describe("PLANNING.md, section 4: how many kits can ship", () => {
  test("ten clutches: 100 bolts and 3 clutches make 9 kits; the tenth needs 8 bolts more", () => {
    const shop = buildShop("kit = 1 clutch + 1 lift + 2 bolt\nclutch = 4 bolt\nlift = 6 bolt", {
      stock: [buildStock("bolt", "100"), buildStock("clutch", "3")],
      demand: [buildDemand("kit", "10")],
    });
    const answer = runCore(shop);
    expect(answer.buildable).toEqual({ kit: 9 });
    expect(answer.ladder.map((rung) => rung.stoppers)).toEqual([
      ...Array.from({ length: 9 }, () => []),
      [{ partNumber: "bolt", missing: "8" }],
    ]);
    expect(answer.shortages).toMatchObject([{ partNumber: "bolt", gross: "108", missing: "8", stopsAt: 10 }]);
  });

  test("1,800 parts, each there 99.9 % of the time, make a complete kit 16.5 % of the time", () => {
    expect(0.999 ** 1800).toBeCloseTo(0.165, 3);
    // Seeded: parts that are there by that chance; a kit can ship only where all of them are.
    const names = Array.from({ length: 1800 }, (_, at) => `P${at}`);
    const parts = [
      buildPart({ partNumber: "kit", sourcing: "make" }),
      ...names.map((partNumber) => buildPart({ partNumber })),
    ];
    const lines = names.map((component) => buildLine({ parent: "kit", component }));
    let state = 12345;
    const chance = () => {
      state = (Math.imul(state, 1664525) + 1013904223) >>> 0;
      return state / 2 ** 32;
    };
    let complete = 0;
    for (let run = 0; run < 100; run++) {
      const there = names.filter(() => chance() < 0.999);
      const stock = there.map((name) => buildStock(name, "1"));
      const shop: Shop = { ...buildShop(""), parts, lines, stock, demand: [buildDemand("kit", "1")] };
      const ships = runCore(shop).buildable.kit === 1;
      expect(ships).toBe(there.length === names.length);
      if (ships) complete += 1;
    }
    expect(complete).toBeGreaterThan(5);
    expect(complete).toBeLessThan(30);
  });

  test("nothing limits a kit of as-required lines: buildable is null", () => {
    const shop = buildShop("kit = 1 grease", { demand: [buildDemand("kit", "1")] });
    shop.lines[0].quantity = null;
    expect(runCore(shop).buildable).toEqual({ kit: null });
  });

  test("buildable is exact at 1,000,000", () => {
    const shop = buildShop("kit = 3 bolt", {
      stock: [buildStock("bolt", "3000000")],
      demand: [buildDemand("kit", "1")],
    });
    expect(runCore(shop).buildable).toEqual({ kit: 1_000_000 });
    shop.stock = [buildStock("bolt", "2999999")];
    expect(runCore(shop).buildable).toEqual({ kit: 999_999 });
  });

  test("promised parts count now, and are left to the build in what comes", () => {
    const shop = buildShop("kit = 1 drive\ndrive = 1 belt", {
      parts: { drive: { leadTimeDays: 5 }, belt: { leadTimeDays: 9 } },
      stock: [buildStock("belt", "1", { nowOnly: true })],
      supply: [buildSupply("drive", "1", "2026-12-11")],
      demand: [buildDemand("kit", "2")],
    });
    const answer = runCore(shop);
    expect(answer.buildable).toEqual({ kit: 1 });
    expect(answer.shortages).toMatchObject([
      { partNumber: "belt", gross: "1", fromStock: "0", short: "1", missing: "1", stopsAt: 2 },
    ]);
    expect(answer.ladder.map((rung) => rung.readyOn)).toEqual(["2026-12-11", "2026-12-15"]);
  });

  test("costs are summed exactly and rounded once, half up", () => {
    const shop = buildShop("kit = 1 nut + 1 nail", {
      parts: { nut: { unitCost: "0.0025" }, nail: { unitCost: "0.0025" } },
      demand: [buildDemand("kit", "3")],
    });
    expect(runCore(shop).ladder.map((rung) => rung.cost)).toEqual(["0.01", "0.01", "0.02"]);
  });

  test("stoppers stand worst first: the latest date, then the cost, then the part number", () => {
    const shop = buildShop("kit = 1 A + 1 B + 1 C + 1 D", {
      parts: {
        A: { leadTimeDays: 5, unitCost: "1" },
        B: { leadTimeDays: 5, unitCost: "1" },
        C: { leadTimeDays: 5, unitCost: "2" },
        D: { leadTimeDays: 6 },
      },
      demand: [buildDemand("kit", "1")],
    });
    expect(runCore(shop).ladder[0].stoppers.map((row) => row.partNumber)).toEqual(["D", "C", "A", "B"]);
  });
});

describe("PLANNING.md, section 4: ten kits, two P each, 12 P on hand, kit 2 waits for another part", () => {
  const tenKits = (sharing: Shop["sharing"]): Shop => {
    const demand = Array.from({ length: 10 }, (_, at) =>
      buildDemand("kit", "1", { options: at === 1 ? ["HEATER"] : [] }),
    );
    const shop = buildShop("kit = 2 P + 1 heater", { sharing, demand, stock: [buildStock("P", "12")] });
    shop.lines[1].option = "HEATER";
    shop.parts = shop.parts.map((part) =>
      part.partNumber === "heater" ? { ...part, leadTimeDays: 56 } : part,
    );
    return shop;
  };
  const shipping = (shop: Shop) =>
    runCore(shop).demand.flatMap((row, at) => (Math.min(row.buildable ?? 0, 1) === 1 ? [at + 1] : []));

  test("strict ships five: 1, 3-6", () => {
    expect(shipping(tenKits("strict"))).toEqual([1, 3, 4, 5, 6]);
    expect(runCore(tenKits("strict")).debts).toBeUndefined();
  });

  test("release ships six: 1, 3-7, with a debt of 2 P to kit 2", () => {
    expect(shipping(tenKits("release"))).toEqual([1, 3, 4, 5, 6, 7]);
    expect(runCore(tenKits("release")).debts).toEqual([{ partNumber: "P", quantity: "2", from: 7, to: 2 }]);
  });

  test("kit 2 waits eight weeks, and the kits without its option do not", () => {
    const { demand } = runCore(tenKits("strict"));
    expect(demand.map((row) => row.earliest)).toEqual(
      demand.map((_, at) => (at === 1 ? "2027-01-26" : "2026-12-01")),
    );
  });
});
