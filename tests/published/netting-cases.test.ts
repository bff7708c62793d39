import { describe, expect, test } from "vitest";
import {
  buildDemand,
  buildLine,
  buildPart,
  buildShop,
  buildStock,
  buildSupply,
  type Shop,
  TODAY,
} from "../support/planning/factories";
import { runCore } from "../support/planning/run-core";

const shortage = (shop: Shop, partNumber: string) =>
  runCore(shop).shortages.find((row) => row.partNumber === partNumber);
const build = (shop: Shop, partNumber: string) =>
  runCore(shop).builds.find((row) => row.partNumber === partNumber);

describe("PLANNING.md, section 1: exact quantities", () => {
  test("0.1 m x 3 is 0.3 m and never one step more", () => {
    const shop = buildShop("kit = 0.1 cable", {
      parts: { cable: { unit: "MTR", decimals: 1 } },
      stock: [buildStock("cable", "0.3")],
      demand: [buildDemand("kit", "3")],
    });
    expect(runCore(shop).shortages).toEqual([]);
    expect(runCore(shop).buildable).toEqual({ kit: 3 });
  });

  test("ten kits x 4 bolts at 2 % scrap is 41, not ten times 5", () => {
    const shop = buildShop("kit = 4 bolt", { demand: [buildDemand("kit", "10")] });
    shop.lines[0].scrap = "0.02";
    expect(shortage(shop, "bolt")?.gross).toBe("41");
  });
});

describe("PLANNING.md, section 2: the structure", () => {
  test("an as-required line never blocks; with none on hand it is a warning", () => {
    const shop = buildShop("kit = 1 hull + 1 grease", { demand: [buildDemand("kit", "2")] });
    shop.lines[1].quantity = null;
    shop.stock = [buildStock("hull", "2")];
    const answer = runCore(shop);
    expect(answer.buildable).toEqual({ kit: 2 });
    expect(answer.shortages).toEqual([]);
    expect(answer.warnings).toEqual([{ code: "as-required-none-on-hand", partNumber: "grease" }]);
  });

  test("a made part without structure is its own shortage, with a warning", () => {
    const shop = buildShop("kit = 2 bracket", {
      parts: { bracket: { sourcing: "make", leadTimeDays: 4 } },
      stock: [buildStock("bracket", "3")],
      demand: [buildDemand("kit", "2")],
    });
    const answer = runCore(shop);
    expect(answer.buildable).toEqual({ kit: 1 });
    expect(answer.shortages).toMatchObject([{ partNumber: "bracket", short: "1", missing: "1", stopsAt: 2 }]);
    expect(answer.builds.map((row) => row.partNumber)).toEqual(["kit"]);
    expect(answer.warnings).toEqual([{ code: "make-without-structure", partNumber: "bracket" }]);
  });

  test("left hand 12, right hand 7 make 7 pairs, not 9", () => {
    const shop = buildShop("pair = 1 left + 1 right", {
      stock: [buildStock("left", "12"), buildStock("right", "7")],
      demand: [buildDemand("pair", "10")],
    });
    expect(runCore(shop).buildable).toEqual({ pair: 7 });
  });

  test("20 good at 15 % rejects: start 24; with 6 good in stock 17", () => {
    const shop = buildShop("kit = 1 duct\nduct = 1 cloth", {
      parts: { duct: { yield: "0.85" } },
      demand: [buildDemand("kit", "20")],
    });
    expect(build(shop, "duct")?.build).toBe("24");
    shop.stock = [buildStock("duct", "6")];
    expect(build(shop, "duct")).toMatchObject({ gross: "20", fromStock: "6", build: "17" });
    expect(shortage(shop, "cloth")?.gross).toBe("17");
  });

  test("kits 098-107, -3 replaces -1 from 101: short 3 of -3, 2 of -1 over; pooled it would say 1", () => {
    const shop = buildShop("kit = 1 old + 1 new", {
      stock: [buildStock("old", "5"), buildStock("new", "4")],
      demand: [buildDemand("kit", "10", { serial: "098" })],
    });
    shop.lines[0].toSerial = "100";
    shop.lines[1].fromSerial = "101";
    const answer = runCore(shop);
    expect(answer.shortages).toMatchObject([
      { partNumber: "new", gross: "7", fromStock: "4", missing: "3", stopsAt: 8 },
    ]);
    expect(answer.buildable).toEqual({ kit: 7 });
    shop.stock = [buildStock("old", "2"), buildStock("new", "7")];
    expect(shortage(shop, "old")).toMatchObject({ gross: "3", missing: "1", stopsAt: 3 });
  });
});

describe("PLANNING.md, section 3: netting", () => {
  test("kit > A > B > C > D, need 100: D 30, not 54", () => {
    const stock = [buildStock("A", "2"), buildStock("B", "15"), buildStock("C", "7"), buildStock("D", "46")];
    const shop = buildShop("kit = 1 A\nA = 1 B\nB = 1 C\nC = 1 D", {
      stock,
      demand: [buildDemand("kit", "100")],
    });
    const builds = runCore(shop).builds.map(({ partNumber, build }) => [partNumber, build]);
    expect(Object.fromEntries(builds)).toEqual({ kit: "100", A: "98", B: "83", C: "76" });
    expect(shortage(shop, "D")).toMatchObject({ gross: "76", fromStock: "46", short: "30", missing: "30" });
  });

  test("phantom: 20 A, A = 1 phantom B = 1 C; usable B 2, C 30: use 2 B and 18 C; 12 C remain", () => {
    const shop = buildShop("A = 1 B\nB = 1 C", {
      parts: { B: { sourcing: "phantom" } },
      stock: [buildStock("B", "2"), buildStock("C", "30")],
      demand: [buildDemand("A", "20")],
    });
    expect(runCore(shop).shortages).toEqual([]);
    expect(runCore(shop).builds.map((row) => row.partNumber)).toEqual(["A"]);
    // 12 C are left over: 32 A can be built, and no 33rd.
    expect(runCore(shop).buildable).toEqual({ A: 32 });
    shop.stock = [buildStock("B", "2"), buildStock("C", "17")];
    expect(shortage(shop, "C")).toMatchObject({ gross: "18", fromStock: "17", missing: "1", stopsAt: 20 });
  });

  test("a ladder of 60 diamonds (2^60 paths) plans, and its quantity is exact", () => {
    const text = Array.from(
      { length: 60 },
      (_, at) => `N${at} = 1 L${at} + 1 R${at}\nL${at} = 1 N${at + 1}\nR${at} = 1 N${at + 1}`,
    );
    const shop = buildShop(text.join("\n"), { demand: [buildDemand("N0", "1")] });
    const before = performance.now();
    expect(shortage(shop, "N60")?.gross).toBe((2n ** 60n).toString());
    expect(performance.now() - before).toBeLessThan(2000);
  });

  test("a chain of 100,000 parts plans", () => {
    const depth = 100_000;
    const parts = Array.from({ length: depth + 1 }, (_, at) =>
      buildPart({
        partNumber: `P${at}`,
        sourcing: at === depth ? "buy" : "make",
        leadTimeDays: at % 1000 === 0 ? 1 : 0,
      }),
    );
    const lines = Array.from({ length: depth }, (_, at) =>
      buildLine({ parent: `P${at}`, component: `P${at + 1}` }),
    );
    const shop: Shop = { ...buildShop(""), parts, lines, demand: [buildDemand("P0", "2")] };
    const answer = runCore(shop);
    expect(answer.shortages).toMatchObject([{ partNumber: `P${depth}`, missing: "2", stopsAt: 1 }]);
    expect(answer.builds.length).toBe(depth);
    expect(answer.criticalChain.length).toBe(depth + 1);
    // The parts with a day of their own: each thousandth but the last is built, the last one is bought.
    expect(answer.earliest).toEqual({ P0: "2027-03-12" });
  });
});

describe("PLANNING.md, section 7: expiry", () => {
  const shop = (today: string, due: string | null) =>
    buildShop("kit = 5 resin", {
      today,
      parts: { resin: { unit: "KGM" } },
      stock: [
        buildStock("resin", "4", { expiresOn: "2027-06-10" }),
        buildStock("resin", "6", { expiresOn: "2027-09-01" }),
      ],
      demand: [buildDemand("kit", "2", { due })],
    });

  test("a lot is usable up to and including its expiry date", () => {
    expect(runCore(shop("2027-06-08", null)).buildable).toEqual({ kit: 2 });
    expect(runCore(shop("2027-06-10", null)).buildable).toEqual({ kit: 2 });
    expect(runCore(shop("2027-06-12", null)).buildable).toEqual({ kit: 1 });
  });

  test("the demand's date decides where there is one", () => {
    expect(runCore(shop("2027-06-08", "2027-06-10")).buildable).toEqual({ kit: 2 });
    expect(shortage(shop("2027-06-08", "2027-06-11"), "resin")).toMatchObject({
      fromStock: "6",
      missing: "4",
      stopsAt: 2,
    });
  });
});

describe("PLANNING.md, section 5: dates", () => {
  test("an overdue order counts from today + lead time, with a warning", () => {
    const shop = buildShop("kit = 1 engine", {
      parts: { engine: { leadTimeDays: 20 }, kit: { leadTimeDays: 3 } },
      supply: [buildSupply("engine", "1", "2026-11-20")],
      demand: [buildDemand("kit", "1")],
    });
    const answer = runCore(shop);
    expect(answer.earliest).toEqual({ kit: "2026-12-24" });
    expect(answer.warnings).toEqual([{ code: "overdue-supply", partNumber: "engine" }]);
    expect(answer.criticalChain).toEqual([
      { partNumber: "kit", why: "build", readyOn: "2026-12-24" },
      { partNumber: "engine", why: "on-order", readyOn: "2026-12-21" },
    ]);
  });

  test("needBy goes down through the parts that are built, orderBy is a lead time before", () => {
    const shop = buildShop("kit = 1 lift\nlift = 1 belt", {
      parts: { kit: { leadTimeDays: 5 }, lift: { leadTimeDays: 10 }, belt: { leadTimeDays: 30 } },
      demand: [buildDemand("kit", "1", { due: "2027-03-01" })],
    });
    expect(shortage(shop, "belt")).toMatchObject({
      needBy: "2027-02-14",
      orderBy: "2027-01-15",
      readyOn: "2026-12-31",
    });
  });

  test("without a date needBy is null and orderBy is today for what is short, null otherwise", () => {
    const shop = buildShop("kit = 1 belt", { demand: [buildDemand("kit", "1")] });
    expect(shortage(shop, "belt")).toMatchObject({ needBy: null, orderBy: TODAY });
    shop.supply = [buildSupply("belt", "1", "2026-12-20")];
    expect(shortage(shop, "belt")).toMatchObject({ needBy: null, orderBy: null, onOrder: "1", missing: "1" });
  });

  test("an open order due after the demand's date is not on order, but it sets the date", () => {
    const shop = buildShop("kit = 1 belt", {
      parts: { belt: { leadTimeDays: 60 } },
      supply: [buildSupply("belt", "1", "2026-12-20")],
      demand: [buildDemand("kit", "1", { due: "2026-12-19" })],
    });
    expect(shortage(shop, "belt")).toMatchObject({ onOrder: "0", short: "1", readyOn: "2026-12-20" });
    shop.demand[0].due = "2026-12-20";
    expect(shortage(shop, "belt")).toMatchObject({ onOrder: "1", short: "0", orderBy: null });
  });
});
