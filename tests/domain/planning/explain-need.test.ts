import fc from "fast-check";
import { expect, test } from "vitest";
import { compileStructure } from "~/domain/planning/compile-structure";
import { compileSupplies } from "~/domain/planning/compile-supplies";
import { explainCover } from "~/domain/planning/explain-cover";
import { explainDate } from "~/domain/planning/explain-date";
import { explainNeed, explainStart } from "~/domain/planning/explain-need";
import type { PassState } from "~/domain/planning/netting/pass-state";
import { planShip, type ShipPlan } from "~/domain/planning/plan-ship";
import type { PlanDemand } from "~/domain/planning/types";
import {
  buildDemand,
  buildLine,
  buildShop,
  buildSupply,
  type Shop,
  TODAY,
} from "../../support/planning/factories";
import { randomShop, type Wishes } from "../../support/planning/random-shop";

function planOf(shop: Shop, first: PlanDemand[] = []): ShipPlan {
  const compiled = compileStructure(shop.parts, shop.lines);
  if (!compiled.ok) throw new Error(JSON.stringify(compiled.problems));
  const { structure } = compiled;
  const supplies = compileSupplies(structure, shop.stock, shop.supply, shop.today);
  const planned = planShip({ structure, supplies, demand: shop.demand, sharing: shop.sharing, first });
  if (!planned.ok) throw new Error(JSON.stringify(planned.problems));
  return planned.plan;
}

/** The first demand is served before, so that every answer has something to stand on. */
function planOnTop(shop: Shop): ShipPlan {
  const [first, ...rest] = shop.demand;
  return rest.length === 0 ? planOf(shop) : planOf({ ...shop, demand: rest }, [first]);
}

const sum = (values: { need: number | bigint }[]) =>
  values.reduce((total, { need }) => total + BigInt(need), 0n);

function holds(wishes: Wishes, numRuns: number, check: (plan: ShipPlan) => void) {
  const either = fc.tuple(randomShop(wishes), fc.boolean());
  const run = ([shop, onTop]: [Shop, boolean]) => check(onTop ? planOnTop(shop) : planOf(shop));
  fc.assert(fc.property(either, run), { numRuns, seed: 20261203 });
}

const passes = ({ served }: ShipPlan): [PassState, PassState][] => [
  [served.now, served.before.now],
  [served.coming, served.before.coming],
];

test("at every level, in both passes, the causes add up to the need", () => {
  let causes = 0;
  holds({}, 300, (plan) => {
    for (const [state, base] of passes(plan)) {
      for (let part = 0; part < plan.structure.parts.length; part++) {
        const why = explainNeed(plan.structure, state, base, part);
        expect(BigInt(why.asked) + sum(why.causes)).toBe(BigInt(why.gross));
        expect(BigInt(why.gross)).toBe(BigInt(state.gross[part]) - BigInt(base.gross[part]));
        causes += why.causes.length;
      }
    }
  });
  expect(causes).toBeGreaterThan(1000);
});

test("read from above and from below, the lines are the same", () => {
  holds({}, 150, ({ structure, served: { coming, before } }) => {
    const all = [...structure.parts.keys()];
    const up = all.flatMap((part) => explainNeed(structure, coming, before.coming, part).causes);
    const down = all.flatMap((part) => explainStart(structure, coming, before.coming, part));
    const byLine = (a: { line: number }, b: { line: number }) => a.line - b.line;
    expect(down.sort(byLine)).toEqual(up.sort(byLine));
  });
});

test("the lots and orders that are used add up to what is covered", () => {
  holds({ release: false }, 300, (plan) => {
    const { now, coming, before } = plan.served;
    for (let part = 0; part < plan.structure.parts.length; part++) {
      const cover = explainCover(plan, part);
      const total = (rows: { used: number | bigint }[]) =>
        rows.reduce((all, { used }) => all + BigInt(used), 0n);
      const added = (after: PassState, earlier: PassState, key: "fromStock" | "onOrder") =>
        BigInt(after[key][part]) - BigInt(earlier[key][part]);
      if (cover.now) expect(total(cover.now)).toBe(added(now, before.now, "fromStock"));
      if (cover.coming) expect(total(cover.coming)).toBe(added(coming, before.coming, "fromStock"));
      expect(total(cover.orders)).toBe(added(coming, before.coming, "onOrder"));
    }
  });
});

test("the chain of any part begins at its own date and goes down by lines", () => {
  holds({}, 200, (plan) => {
    const { structure } = plan;
    for (let part = 0; part < structure.parts.length; part++) {
      const chain = explainDate(plan, part);
      if (structure.open[part] === 0 || structure.leaf[part]) expect(chain.length).toBeGreaterThan(0);
      chain.slice(1).forEach((link, at) => {
        const lines = structure.lines.filter((line) => line.parent === chain[at].partNumber);
        expect(lines.map((line) => line.component)).toContain(link.partNumber);
      });
    }
  });
});

test("scrap is rounded up once a line, and the cause says that it was", () => {
  const shop = buildShop("kit = 1 clutch", { demand: [buildDemand("kit", "10")] });
  shop.parts.push({ ...shop.parts[1], partNumber: "bolt" });
  shop.parts[1] = { ...shop.parts[1], sourcing: "make", yield: "0.85" };
  shop.lines.push(buildLine({ parent: "clutch", component: "bolt", quantity: "4", scrap: "0.05" }));
  const { structure, served } = planOf(shop);
  const [clutch, bolt] = ["clutch", "bolt"].map((name) =>
    structure.parts.findIndex((part) => part.partNumber === name),
  );
  const { causes } = explainNeed(structure, served.now, served.before.now, bolt);
  // 10 good of 85 % take 12 to start; 12 x 4 / 0.95 = 50.5.
  expect(causes).toMatchObject([{ parent: clutch, through: 12, need: 51, isRounded: true }]);
});

test("an order that comes after the date asked is not used", () => {
  const shop = buildShop("kit = 1 bolt", {
    demand: [buildDemand("kit", "5", { due: "2026-12-10" })],
    supply: [buildSupply("bolt", "2", "2026-12-09"), buildSupply("bolt", "9", "2026-12-20")],
    today: TODAY,
  });
  const plan = planOf(shop);
  const bolt = plan.structure.parts.findIndex((part) => part.partNumber === "bolt");
  expect(explainCover(plan, bolt).orders.map(({ row, used }) => [row, used])).toEqual([
    [0, 2],
    [1, 0],
  ]);
  expect(explainDate(plan, bolt)).toMatchObject([
    { partNumber: "bolt", why: "on-order", readyOn: "2026-12-20" },
  ]);
});
