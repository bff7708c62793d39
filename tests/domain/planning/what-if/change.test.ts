import { describe, expect, test } from "vitest";
import { compileStructure } from "~/domain/planning/compile-structure";
import type { PlanStock } from "~/domain/planning/types";
import { changeStock } from "~/domain/planning/what-if/change-stock";
import { changeStructure } from "~/domain/planning/what-if/change-structure";
import { changeSupply } from "~/domain/planning/what-if/change-supply";
import type { WhatIf } from "~/domain/planning/what-if/what-if";
import {
  buildLine,
  buildPart,
  buildShop,
  buildStock,
  buildSupply,
} from "../../../support/planning/factories";

const shop = buildShop("kit = 2 bolt + 1 rope", { parts: { rope: { decimals: 2 } } });
const compiled = compileStructure(shop.parts, shop.lines);
if (!compiled.ok) throw new Error("This shop can be planned.");
const { structure } = compiled;

const book: PlanStock[] = [
  buildStock("bolt", "5", { lot: "L1", expiresOn: "2027-01-01" }),
  buildStock("bolt", "4", { lot: "L2" }),
  buildStock("rope", "3.25"),
];

type Change = Partial<Pick<WhatIf, "hold" | "stock">>;
const stockAfter = (change: Change, stock = book) => {
  const changed = changeStock(structure, stock, { hold: [], stock: [], ...change });
  if (!changed.ok) return changed.problems;
  return changed.stock
    .filter(({ quantity }) => Number(quantity) > 0)
    .map(({ partNumber, quantity, lot }) => `${quantity} ${partNumber} ${lot ?? "-"}`)
    .sort();
};
const change = (partNumber: string, amount: string): Change => ({ stock: [{ partNumber, change: amount }] });

describe("changeStock", () => {
  test.each<[string, Change, string[]]>([
    ["nothing", {}, ["3.25 rope -", "4 bolt L2", "5 bolt L1"]],
    ["more", change("BOLT", "+3"), ["3 BOLT -", "3.25 rope -", "4 bolt L2", "5 bolt L1"]],
    ["more without a sign", change("rope", "0.5"), ["0.50 rope -", "3.25 rope -", "4 bolt L2", "5 bolt L1"]],
    [
      "less, from the lot that never expires",
      change("bolt", "-3"),
      ["1 bolt L2", "3.25 rope -", "5 bolt L1"],
    ],
    ["less, into the next lot", change("bolt", "-6"), ["3 bolt L1", "3.25 rope -"]],
    ["less to nothing", change("rope", "-3.25"), ["4 bolt L2", "5 bolt L1"]],
    ["one lot held", { hold: [{ partNumber: "Bolt", lot: "L1" }] }, ["3.25 rope -", "4 bolt L2"]],
    ["a part held", { hold: [{ partNumber: "bolt", lot: null }] }, ["3.25 rope -"]],
    [
      "held first, then more",
      { hold: [{ partNumber: "bolt", lot: null }], ...change("bolt", "1") },
      ["1 bolt -", "3.25 rope -"],
    ],
  ])("%s", (_, asked, rows) => {
    const before = structuredClone(book);
    expect(stockAfter(asked)).toEqual(rows);
    expect(book).toEqual(before);
  });

  test.each<[string, Change, object]>([
    ["an unknown part", change("nut", "1"), { code: "unknown-part", list: "stock", at: 0 }],
    ["too many decimals", change("bolt", "0.5"), { code: "too-many-decimals", decimals: 0, quantity: "0.5" }],
    ["more than there is", change("bolt", "-10"), { code: "less-than-nothing", available: "9" }],
    [
      "an unknown part to hold",
      { hold: [{ partNumber: "nut", lot: null }] },
      { code: "unknown-part", list: "hold" },
    ],
    ["an unknown lot", { hold: [{ partNumber: "bolt", lot: "L9" }] }, { code: "unknown-lot", lot: "L9" }],
  ])("refuses %s", (_, asked, problem) => {
    expect(stockAfter(asked)).toMatchObject([problem]);
  });

  test("names every change that cannot be tried", () => {
    const stock = [...(change("nut", "1").stock ?? []), ...(change("bolt", "-99").stock ?? [])];
    expect(stockAfter({ stock })).toMatchObject([{ at: 0 }, { at: 1 }]);
  });
});

describe("changeSupply", () => {
  const open = [
    { ...buildSupply("bolt", "5", "2027-01-01"), reference: "PO-1" },
    { ...buildSupply("rope", "1", null), reference: "PO-1" },
    { ...buildSupply("bolt", "7", "2027-02-01"), reference: "PO-2" },
  ];

  test("moves every line of an order and leaves the others", () => {
    const changed = changeSupply(structure, open, [{ reference: "PO-1", due: "2027-03-01" }]);
    expect(changed.ok && changed.supply.map(({ due }) => due)).toEqual([
      "2027-03-01",
      "2027-03-01",
      "2027-02-01",
    ]);
    expect(open[0].due).toBe("2027-01-01");
  });

  test("adds an order", () => {
    const changed = changeSupply(structure, open, [{ partNumber: "rope", quantity: "2.5", due: null }]);
    expect(changed.ok && changed.supply.at(-1)).toEqual(buildSupply("rope", "2.5", null));
  });

  test.each([
    [
      { reference: "PO-9", due: null },
      { code: "unknown-reference", reference: "PO-9" },
    ],
    [
      { partNumber: "nut", quantity: "1", due: null },
      { code: "unknown-part", list: "supply" },
    ],
    [
      { partNumber: "bolt", quantity: "1.5", due: null },
      { code: "too-many-decimals", list: "supply" },
    ],
  ])("refuses %o", (asked, problem) => {
    expect(changeSupply(structure, open, [asked])).toMatchObject({ ok: false, problems: [problem] });
  });
});

describe("changeStructure", () => {
  test("gives the same structure where nothing changes", () => {
    expect(changeStructure(structure, { parts: [], structure: [] })).toEqual({ ok: true, structure });
  });

  test("replaces a part and adds another", () => {
    const parts = [buildPart({ partNumber: "BOLT", leadTimeDays: 9 }), buildPart({ partNumber: "nut" })];
    const changed = changeStructure(structure, { parts, structure: [] });
    if (!changed.ok) throw new Error("This can be tried.");
    const { numberOf, leadTime } = changed.structure;
    expect(leadTime[numberOf.get("BOLT") as number]).toBe(9);
    expect(changed.structure.parts).toHaveLength(4);
    expect(structure.parts).toHaveLength(3);
  });

  test("replaces a parent's lines whole and keeps those of others", () => {
    const lines = [buildLine({ parent: "KIT", component: "rope", quantity: "9" })];
    const changed = changeStructure(structure, { parts: [], structure: [{ parent: "Kit", lines }] });
    expect(changed.ok && changed.structure.lines).toEqual(lines);
    const none = changeStructure(structure, { parts: [], structure: [{ parent: "rope", lines: [] }] });
    expect(none.ok && none.structure.lines).toEqual(structure.lines);
  });

  test("says what loop it would make", () => {
    const lines = [buildLine({ parent: "bolt", component: "kit" })];
    const changed = changeStructure(structure, { parts: [], structure: [{ parent: "bolt", lines }] });
    expect(changed).toMatchObject({ ok: false, problems: [{ code: "loop" }] });
  });
});
