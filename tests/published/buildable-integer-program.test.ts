import fc from "fast-check";
import loadHighs, { type Highs } from "highs";
import { beforeAll, expect, test } from "vitest";
import { buildStock, type Shop } from "../support/planning/factories";
import { randomShop } from "../support/planning/random-shop";
import { runCore } from "../support/planning/run-core";

let highs: Highs;
beforeAll(async () => {
  highs = await loadHighs();
});

const MOST = 5000;

/**
 * As many kits n as there are: whole builds b of each made part, and for each part
 * stock + builds - what the parents' builds take - n (the kit itself) >= 0.
 */
function program(shop: Shop): string {
  const name = (partNumber: string) => `b${shop.parts.findIndex((part) => part.partNumber === partNumber)}`;
  const parents = new Set(shop.lines.map((line) => line.parent));
  const kit = shop.demand[0].partNumber;
  const rows = shop.parts.map((part, at) => {
    const stock = shop.stock.filter((row) => row.partNumber === part.partNumber);
    const onHand = stock.reduce((total, row) => total + Number(row.quantity), 0);
    const takes = shop.lines
      .filter((line) => line.component === part.partNumber && Number(line.quantity ?? 0) > 0)
      .map((line) => ` - ${line.quantity} ${name(line.parent)}`);
    const made = parents.has(part.partNumber) ? ` + b${at}` : "";
    const shipped = part.partNumber === kit ? " - n" : "";
    return ` r${at}: 0 n${made}${shipped}${takes.join("")} >= ${-onHand}`;
  });
  const builds = [...parents].map(name);
  const bounds = [` n <= ${MOST}`, ...builds.map((build) => ` ${build} <= 1000000`)];
  return [
    "Maximize",
    " obj: n",
    "Subject To",
    ...rows,
    "Bounds",
    ...bounds,
    "General",
    ` n ${builds.join(" ")}`,
    "End",
  ].join("\n");
}

test("an integer program finds the same number of kits (COMPUTED: highs)", () => {
  const wishes = {
    demands: 1,
    dates: false,
    conditions: false,
    losses: false,
    decimals: false,
    expiry: false,
    supply: false,
  };
  // Enough of everything that most shops can build some.
  const rich = randomShop(wishes).map((shop) => ({
    ...shop,
    stock: [
      ...shop.stock,
      ...shop.parts.slice(2).map((part, at) => buildStock(part.partNumber, String(5 + 7 * at))),
    ],
  }));
  const found: number[] = [];
  fc.assert(
    fc.property(rich, (shop) => {
      const { Status, ObjectiveValue } = highs.solve(program(shop));
      expect(Status).toBe("Optimal");
      const { buildable } = runCore(shop).demand[0];
      expect(Math.min(buildable ?? MOST, MOST)).toBe(Math.round(ObjectiveValue));
      found.push(Math.round(ObjectiveValue));
    }),
    { numRuns: 150, seed: 20261205 },
  );
  expect(new Set(found).size).toBeGreaterThan(10);
});
