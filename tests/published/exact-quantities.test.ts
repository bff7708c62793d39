import Decimal from "decimal.js";
import fc from "fast-check";
import { expect, test } from "vitest";
import { buildDemand, buildShop, buildStock } from "../support/planning/factories";
import { runCore } from "../support/planning/run-core";

const Exact = Decimal.clone({ precision: 200 });

const decimal = (digits: number, decimals: number, least = 1n) =>
  fc
    .bigInt({ min: least, max: 10n ** BigInt(digits) })
    .map((steps) => new Exact(steps.toString()).div(new Exact(10).pow(decimals)).toFixed(decimals));

test("kits x quantity / (1 - scrap), rounded up to a step, as decimal.js has it (COMPUTED: decimal.js)", () => {
  const asked = fc.integer({ min: 0, max: 6 }).chain((decimals) =>
    fc.record({
      decimals: fc.constant(decimals),
      quantity: decimal(decimals + 9, decimals),
      scrap: fc.integer({ min: 0, max: 99_999_999 }).map((n) => `0.${String(n).padStart(8, "0")}`),
      kits: fc.integer({ min: 1, max: 1000 }),
    }),
  );
  fc.assert(
    fc.property(asked, ({ decimals, quantity, scrap, kits }) => {
      const shop = buildShop(`kit = ${quantity} P`, {
        parts: { P: { decimals } },
        demand: [buildDemand("kit", `${kits}`)],
      });
      shop.lines[0].scrap = scrap;
      const need = new Exact(quantity).times(kits).div(new Exact(1).minus(scrap));
      const gross = need.toDecimalPlaces(decimals, Decimal.ROUND_UP).toFixed(decimals);
      expect(runCore(shop).shortages[0].gross).toBe(gross);
    }),
    { numRuns: 300, seed: 20261203 },
  );
});

test("past 2^53 steps every digit stays (COMPUTED: decimal.js)", () => {
  fc.assert(
    fc.property(
      decimal(17, 6, 10n ** 9n),
      decimal(17, 6, 10n ** 9n),
      fc.integer({ min: 2, max: 9_999 }),
      (first, second, kits) => {
        const shop = buildShop(`kit = ${kits} A\nA = ${first} B\nB = ${second} C`, {
          parts: { A: { decimals: 6 }, B: { decimals: 6 }, C: { decimals: 6, unitCost: "0.01" } },
          stock: [buildStock("C", "0.000001")],
          demand: [buildDemand("kit", "3")],
        });
        const b = new Exact(first).times(kits).times(3);
        const c = new Exact(second).times(b).toDecimalPlaces(6, Decimal.ROUND_UP);
        const short = c.minus("0.000001");
        const answer = runCore(shop);
        expect(answer.shortages).toMatchObject([{ gross: c.toFixed(6), short: short.toFixed(6) }]);
        expect(answer.ladder[2].cost).toBe(short.times("0.01").toFixed(2, Decimal.ROUND_HALF_UP));
      },
    ),
    { numRuns: 200, seed: 20261204 },
  );
});
