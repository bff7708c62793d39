import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { comparable } from "../../../support/planning/comparable";
import { buildDemand, buildShop, buildStock, type Shop } from "../../../support/planning/factories";
import { addDays, expectedOn } from "../../../support/planning/naive-netting";
import { randomShop, type Wishes } from "../../../support/planning/random-shop";
import { toSteps } from "../../../support/planning/rational";
import { runCore } from "../../../support/planning/run-core";
import { blocksOf, lacksNothing } from "../../../support/planning/service-order";

const steps = (text: string) => toSteps(text, 6);
const one: Wishes = { demands: 1 };

function holds(wishes: Wishes, numRuns: number, check: (shop: Shop) => void) {
  fc.assert(fc.property(randomShop(wishes), check), { numRuns, seed: 20261202 });
}

describe("what holds of every answer", () => {
  test("gross = from stock + on order + short", () => {
    holds({}, 300, (shop) => {
      for (const row of runCore(shop).shortages) {
        expect(steps(row.gross)).toBe(steps(row.fromStock) + steps(row.onOrder) + steps(row.short));
      }
    });
  });

  test("one demand of ten and ten demands of one agree", () => {
    holds({ demands: 1, conditions: false, kits: 10 }, 150, (shop) => {
      const [whole] = shop.demand;
      const single = Array.from({ length: Number(whole.quantity) }, () => ({ ...whole, quantity: "1" }));
      const { demand: _, ...together } = comparable(runCore(shop));
      const { demand: __, ...apart } = comparable(runCore({ ...shop, demand: single }));
      expect(apart).toEqual(together);
    });
  });

  test("buildable is exact: n kits lack nothing, n + 1 lack something", () => {
    holds(one, 150, (shop) => {
      const { buildable } = runCore(shop).demand[0];
      if (buildable === null) return;
      expect(lacksNothing(shop, blocksOf(shop, 0, BigInt(buildable), false))).toBe(true);
      if (buildable < 1_000_000) {
        expect(lacksNothing(shop, blocksOf(shop, 0, BigInt(buildable) + 1n, false))).toBe(false);
      }
    });
  });

  test("more stock never lowers buildable", () => {
    holds(one, 200, (shop) => {
      const before = runCore(shop).demand[0].buildable ?? 0;
      for (const part of shop.parts) {
        const stock = [...shop.stock, buildStock(part.partNumber, "1")];
        const after = runCore({ ...shop, stock }).demand[0].buildable;
        expect(after ?? Number.POSITIVE_INFINITY).toBeGreaterThanOrEqual(before);
      }
    });
  });

  test("the critical chain goes from a kit down, each link by a line and by its reason", () => {
    holds({}, 300, (shop) => {
      const { criticalChain, earliest } = runCore(shop);
      const part = (partNumber: string) => {
        const found = shop.parts.find((one) => one.partNumber === partNumber);
        if (!found) throw new Error(`no part ${partNumber}`);
        return found;
      };
      expect(criticalChain[0].readyOn).toBe(Object.values(earliest).sort().at(-1));
      criticalChain.forEach((link, at) => {
        const next = criticalChain[at + 1];
        const { leadTimeDays, sourcing } = part(link.partNumber);
        if (next) {
          expect(link.why).toBe("build");
          const lines = shop.lines.filter((line) => line.parent === link.partNumber);
          expect(lines.map((line) => line.component)).toContain(next.partNumber);
          expect(addDays(next.readyOn, sourcing === "phantom" ? 0 : leadTimeDays)).toBe(link.readyOn);
        } else if (link.why === "stock") expect(link.readyOn).toBe(shop.today);
        else if (link.why === "on-order") {
          const orders = shop.supply.filter((row) => row.partNumber === link.partNumber);
          const dates = orders.map((row) => expectedOn(row.due, part(link.partNumber), shop.today));
          expect(dates).toContain(link.readyOn);
        } else expect(link.readyOn).toBe(addDays(shop.today, sourcing === "phantom" ? 0 : leadTimeDays));
      });
    });
  });

  test("warnings name parts that are so", () => {
    holds({}, 300, (shop) => {
      const { warnings, shortages } = runCore(shop);
      const parents = new Set(shop.lines.map((line) => line.parent));
      const bare = shop.parts.filter((part) => part.sourcing === "make" && !parents.has(part.partNumber));
      const allowed: Record<string, Set<string>> = {
        "as-required-none-on-hand": new Set(
          shop.lines.filter((line) => line.quantity === null).map((line) => line.component),
        ),
        "make-without-structure": new Set(bare.map((part) => part.partNumber)),
        "overdue-supply": new Set(
          shop.supply.filter((row) => row.due !== null && row.due < shop.today).map((row) => row.partNumber),
        ),
        "supply-without-date": new Set(
          shop.supply.filter((row) => row.due === null).map((row) => row.partNumber),
        ),
      };
      for (const { code, partNumber } of warnings) expect(allowed[code]).toContain(partNumber);
      for (const { partNumber } of shortages.filter((row) =>
        allowed["make-without-structure"].has(row.partNumber),
      )) {
        expect(warnings).toContainEqual({ code: "make-without-structure", partNumber });
      }
    });
  });

  test("a debt is above 0 and stands between two demands", () => {
    holds({ release: true, kits: 2, demands: 4, dates: false, expiry: false }, 150, (shop) => {
      const { debts } = runCore(shop);
      expect(debts).toBeDefined();
      for (const debt of debts ?? []) {
        expect(steps(debt.quantity)).toBeGreaterThan(0n);
        expect(debt.from).not.toBe(debt.to);
        expect(shop.demand[debt.from - 1]).toBeDefined();
        expect(shop.demand[debt.to - 1]).toBeDefined();
      }
    });
  });
});

test("part numbers that name parts of every object are ordinary text", () => {
  const names = ["__proto__", "constructor", "toString", "hasOwnProperty", "007", "7", "1E05", "3-12"];
  const shop = buildShop(`kit = ${names.map((name) => `1 ${name}`).join(" + ")}`, {
    demand: [buildDemand("kit", "1")],
  });
  expect(
    runCore(shop)
      .shortages.map((row) => row.partNumber)
      .sort(),
  ).toEqual([...names].sort());
  const kit = buildShop("__proto__ = 1 constructor", { demand: [buildDemand("__proto__", "2")] });
  expect(Object.entries(runCore(kit).buildable)).toEqual([["__proto__", 0]]);
});
