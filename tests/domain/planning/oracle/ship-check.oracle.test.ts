import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { comparable } from "../../../support/planning/comparable";
import { buildDemand, buildShop, buildStock, type Shop } from "../../../support/planning/factories";
import { naiveShipCheck } from "../../../support/planning/naive-ship-check";
import { randomShop, type Wishes } from "../../../support/planning/random-shop";
import { runCore } from "../../../support/planning/run-core";

function agree(shop: Shop): void {
  expect(comparable(runCore(shop))).toEqual(comparable(naiveShipCheck(shop)));
}

const plain: Wishes = {
  demands: 1,
  dates: false,
  conditions: false,
  losses: false,
  decimals: false,
  expiry: false,
  supply: false,
};

const shops: [string, Wishes, number][] = [
  ["structure and stock alone", plain, 150],
  ["scrap, yield and decimals", { ...plain, losses: true, decimals: true }, 150],
  ["open orders, overdue and late", { ...plain, supply: true }, 100],
  ["dates and expiry", { ...plain, supply: true, dates: true, expiry: true }, 100],
  ["options, serials and effectivity", { ...plain, conditions: true, dates: true }, 150],
  ["several demands", { ...plain, demands: 4, losses: true, decimals: true }, 100],
  ["everything", {}, 150],
  ["release", { ...plain, demands: 4, release: true, kits: 3 }, 60],
  ["release with everything", { release: true, kits: 3 }, 60],
];

describe("the core's figures are those of the naive plan", () => {
  test.each(shops)("%s", (_, wishes, numRuns) => {
    fc.assert(fc.property(randomShop(wishes), agree), { numRuns, seed: 20261201 });
  });
});

describe("cases that a random shop has found", () => {
  test("kits past a line's last serial need nothing, but those before it are stopped", () => {
    const shop = buildShop("K = 1 A", { demand: [buildDemand("K", "5", { serial: "097" })] });
    shop.lines[0].toSerial = "100";
    expect(runCore(shop).buildable).toEqual({ K: 0 });
    agree(shop);
  });

  test("a demand served from stock asks for no component of the part in stock", () => {
    const shop = buildShop("kit = 1 unit\nunit = 1 cell", {
      parts: { kit: { leadTimeDays: 90 }, unit: { leadTimeDays: 1 }, cell: { leadTimeDays: 3 } },
      stock: [buildStock("unit", "1")],
      demand: [
        buildDemand("kit", "1", { due: "2027-06-09" }),
        buildDemand("kit", "1", { due: "2027-06-11" }),
      ],
    });
    expect(runCore(shop).shortages).toMatchObject([{ partNumber: "cell", needBy: "2027-03-12" }]);
    agree(shop);
  });

  test("a demand served from stock sets no order date for a later one's shortage", () => {
    const shop = buildShop("kit = 1 cell", {
      parts: { cell: { leadTimeDays: 3 } },
      stock: [buildStock("cell", "1")],
      demand: [
        buildDemand("kit", "1", { due: "2027-06-09" }),
        buildDemand("kit", "1", { due: "2027-06-11" }),
      ],
    });
    expect(runCore(shop).shortages).toMatchObject([{ needBy: "2027-06-09", orderBy: "2027-06-08" }]);
    agree(shop);
  });
});
