import { expect, test } from "vitest";
import type { PlanLine, PlanStock, PlanSupply } from "~/domain/planning/types";
import {
  buildDemand,
  buildLine,
  buildShop,
  buildStock,
  buildSupply,
} from "../../../support/planning/factories";
import { runCore } from "../../../support/planning/run-core";

interface Case {
  lines?: PlanLine[];
  stock?: PlanStock[];
  supply?: PlanSupply[];
  due?: string;
}

const GLUE = buildLine({ parent: "kit", component: "glue", quantity: null });

function warningsOf({ lines = [], stock = [], supply = [], due }: Case): string[] {
  const parts = { glue: {}, sub: { sourcing: "make" as const } };
  const shop = buildShop("kit = 1 bolt + 1 sub", {
    parts,
    demand: [buildDemand("kit", "5", { due: due ?? null })],
  });
  const subs = buildStock("sub", "5");
  const answer = runCore({ ...shop, lines: [...shop.lines, ...lines], stock: [subs, ...stock], supply });
  return answer.warnings.map(({ code, partNumber }) => `${partNumber}: ${code}`);
}

test.each<[string, Case, string[]]>([
  ["nothing to warn of", {}, []],
  ["as required, none there", { lines: [GLUE] }, ["glue: as-required-none-on-hand"]],
  ["as required, some there", { lines: [GLUE], stock: [buildStock("glue", "1")] }, []],
  [
    "as required, expired",
    { lines: [GLUE], stock: [buildStock("glue", "1", { expiresOn: "2026-11-30" })] },
    ["glue: as-required-none-on-hand"],
  ],
  [
    "as required, expired by the date asked for",
    { lines: [GLUE], stock: [buildStock("glue", "1", { expiresOn: "2026-12-31" })], due: "2027-01-04" },
    ["glue: as-required-none-on-hand"],
  ],
  ["a line twice is one warning", { lines: [GLUE, GLUE] }, ["glue: as-required-none-on-hand"]],
  [
    "an overdue order that counts",
    { supply: [buildSupply("bolt", "5", "2026-11-01")] },
    ["bolt: overdue-supply"],
  ],
  [
    "an order without a date that counts",
    { supply: [buildSupply("bolt", "5", null)] },
    ["bolt: supply-without-date"],
  ],
  [
    "an overdue order that is not needed",
    { stock: [buildStock("bolt", "5")], supply: [buildSupply("bolt", "5", "2026-11-01")] },
    [],
  ],
  ["an order to come", { supply: [buildSupply("bolt", "5", "2027-01-01")] }, []],
])("%s", (_, shop, warnings) => {
  expect(warningsOf(shop)).toEqual(warnings);
});

test("a part that is made of nothing and is missing", () => {
  const shop = buildShop("kit = 1 sub", {
    parts: { sub: { sourcing: "make" } },
    demand: [buildDemand("kit", "1")],
  });
  expect(runCore(shop).warnings).toEqual([{ code: "make-without-structure", partNumber: "sub" }]);
});
