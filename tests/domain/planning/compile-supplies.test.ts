import { describe, expect, test } from "vitest";
import { compileStructure } from "~/domain/planning/compile-structure";
import { compileSupplies } from "~/domain/planning/compile-supplies";
import { dayNumber, isoDate } from "~/domain/planning/dates/day-number";
import { lastUsedDay } from "~/domain/planning/dates/last-used-day";
import type { Pool } from "~/domain/planning/netting/pool";
import type { PlanStock, PlanSupply } from "~/domain/planning/types";
import { buildPart, buildStock, buildSupply, TODAY } from "../../support/planning/factories";

const compiled = compileStructure(
  [buildPart({ partNumber: "A", leadTimeDays: 10 }), buildPart({ partNumber: "B", decimals: 2 })],
  [],
);
if (!compiled.ok) throw new Error("These parts can be planned.");
const { structure } = compiled;
const compile = (stock: PlanStock[], supply: PlanSupply[] = []) =>
  compileSupplies(structure, stock, supply, TODAY);

const bucketsOf = (pool: Pool, part: number) =>
  pool.buckets.get(part)?.map(({ day, quantity, flag, row }) => ({
    day: Number.isFinite(day) ? isoDate(day) : "never",
    quantity,
    flag,
    row,
  }));

describe("stock", () => {
  test("adds up by part in whole steps, however its number is written; other parts are left out", () => {
    const { stockNow, wide } = compile([
      buildStock("A", "3"),
      buildStock("b", "1.25"),
      buildStock(" a", "4"),
      buildStock("X", "9"),
    ]);
    expect([...(stockNow.totals as Float64Array)]).toEqual([7, 125]);
    expect(stockNow.buckets.size).toBe(0);
    expect(wide).toBe(false);
  });

  test("keeps lots apart, first to expire first, where one of them expires", () => {
    const { stockNow } = compile([
      buildStock("A", "1"),
      buildStock("A", "2", { expiresOn: "2027-05-01" }),
      buildStock("A", "4", { expiresOn: "2027-01-01" }),
    ]);
    expect(bucketsOf(stockNow, 0)).toEqual([
      { day: "2027-01-01", quantity: 4, flag: null, row: 2 },
      { day: "2027-05-01", quantity: 2, flag: null, row: 1 },
      { day: "never", quantity: 1, flag: null, row: 0 },
    ]);
  });

  test("of builds under way counts now alone", () => {
    const { stockNow, stockComing } = compile([
      buildStock("A", "3"),
      buildStock("A", "5", { nowOnly: true }),
    ]);
    expect([stockNow.totals[0], stockComing.totals[0]]).toEqual([8, 3]);
  });

  test("past 2^53 steps is exact, and said", () => {
    const { stockNow, wide } = compile([buildStock("A", "9007199254740991"), buildStock("A", "2")]);
    expect(stockNow.totals[0]).toBe(9_007_199_254_740_993n);
    expect(wide).toBe(true);
  });

  test("that does not fit its part is a fault", () => {
    expect(() => compile([buildStock("A", "1.5")])).toThrow("too-many-decimals");
  });
});

describe("open orders", () => {
  const supply = [
    buildSupply("A", "1", null),
    buildSupply("A", "2", "2026-11-30"),
    buildSupply("A", "4", "2026-12-01"),
    buildSupply("A", "8", "2027-02-01"),
  ];
  const { orders } = compile([], supply);

  test("count from their day; overdue and undated ones from today and the lead time", () => {
    expect(bucketsOf(orders, 0)).toEqual([
      { day: "2026-12-01", quantity: 4, flag: null, row: 2 },
      { day: "2026-12-11", quantity: 1, flag: "undated", row: 0 },
      { day: "2026-12-11", quantity: 2, flag: "overdue", row: 1 },
      { day: "2027-02-01", quantity: 8, flag: null, row: 3 },
    ]);
    expect(orders.totals[0]).toBe(15);
  });

  test.each([
    [1, "2026-12-01"],
    [4, "2026-12-01"],
    [5, "2026-12-11"],
    [7, "2026-12-11"],
    [8, "2027-02-01"],
    [15, "2027-02-01"],
  ])("%i of them are there on %s", (used, date) => {
    expect(lastUsedDay(orders, 0, used)).toBe(dayNumber(date));
  });

  test("cannot be used past what there is", () => {
    expect(() => lastUsedDay(orders, 0, 16)).toThrow("More on order is used than there is.");
  });
});
