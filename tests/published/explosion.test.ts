import fc from "fast-check";
import { inv, matrix } from "mathjs";
import { describe, expect, test } from "vitest";
import {
  buildDemand,
  buildLine,
  buildPart,
  buildShop,
  buildStock,
  type Shop,
} from "../support/planning/factories";
import { runCore } from "../support/planning/run-core";

const BRACKET = `
  bracket = 1 base + 2 spring + 4 clamp
  base = 1 clamp + 2 housing
  clamp = 1 handle + 1 casting
  housing = 2 bearing + 1 shaft`;

/** What the answer says of every part that is not covered by stock: gross, and net (short, or to build). */
function figures(shop: Shop): Record<string, { gross: number; net: number }> {
  const { shortages, builds } = runCore(shop);
  return Object.fromEntries([
    ...shortages.map(({ partNumber, gross, short }) => [
      partNumber,
      { gross: Number(gross), net: Number(short) },
    ]),
    ...builds.map(({ partNumber, gross, build }) => [
      partNumber,
      { gross: Number(gross), net: Number(build) },
    ]),
  ]);
}

const pick = (shop: Shop, name: "gross" | "net") =>
  Object.fromEntries(Object.entries(figures(shop)).map(([partNumber, row]) => [partNumber, row[name]]));

describe("bracket (READ: Heizer, Render, Munson, Operations Management, 2017, problem 14.3, solution p. 226)", () => {
  test("gross for 50", () => {
    expect(pick(buildShop(BRACKET, { demand: [buildDemand("bracket", "50")] }), "gross")).toEqual({
      bracket: 50,
      base: 50,
      spring: 100,
      clamp: 250,
      housing: 100,
      handle: 250,
      casting: 250,
      bearing: 200,
      shaft: 100,
    });
  });

  test("net with 25 bases and 100 clamps in stock", () => {
    const stock = [buildStock("base", "25"), buildStock("clamp", "100")];
    expect(pick(buildShop(BRACKET, { stock, demand: [buildDemand("bracket", "50")] }), "net")).toEqual({
      bracket: 50,
      base: 25,
      spring: 100,
      clamp: 125,
      housing: 50,
      handle: 125,
      casting: 125,
      bearing: 100,
      shaft: 50,
    });
  });

  test("per bracket, the bracket column of (I - N)^-1 (COMPUTED: mathjs)", () => {
    const shop = buildShop(BRACKET, { demand: [buildDemand("bracket", "1")] });
    expect(pick(shop, "gross")).toEqual(totalRequirements(shop, "bracket"));
    expect(totalRequirements(shop, "bracket")).toEqual({
      bracket: 1,
      base: 1,
      spring: 2,
      clamp: 5,
      housing: 2,
      handle: 5,
      casting: 5,
      bearing: 4,
      shaft: 2,
    });
  });
});

/** The kit's column of (I - N)^-1, N holding what one parent takes of each component; zeros left out. */
function totalRequirements(shop: Shop, kit: string): Record<string, number> {
  const at = new Map(shop.parts.map((part, index) => [part.partNumber, index]));
  const place = (partNumber: string) => at.get(partNumber) ?? -1;
  const next = shop.parts.map((_, row) => shop.parts.map((_, column): number => (row === column ? 1 : 0)));
  for (const line of shop.lines) next[place(line.component)][place(line.parent)] -= Number(line.quantity);
  const total = inv(matrix(next)).toArray() as number[][];
  const column = shop.parts.map(
    (part, row) => [part.partNumber, Math.round(total[row][place(kit)])] as const,
  );
  return Object.fromEntries(column.filter(([, quantity]) => quantity > 0));
}

/** Nine parts, whole quantities, only lines from a lower to a higher number. */
const acyclic: fc.Arbitrary<Shop> = fc
  .array(fc.tuple(fc.nat({ max: 8 }), fc.nat({ max: 8 }), fc.integer({ min: 1, max: 5 })), {
    minLength: 6,
    maxLength: 24,
  })
  .map((picks) => {
    const lines = picks
      .filter(([a, b]) => a !== b)
      .map(([a, b, quantity]) =>
        buildLine({
          parent: `P${Math.min(a, b)}`,
          component: `P${Math.max(a, b)}`,
          quantity: String(quantity),
        }),
      );
    const parents = new Set(lines.map((line) => line.parent));
    const parts = Array.from({ length: 9 }, (_, at) =>
      buildPart({ partNumber: `P${at}`, sourcing: parents.has(`P${at}`) ? "make" : "buy" }),
    );
    return { ...buildShop("", { demand: [buildDemand("P0", "7")] }), parts, lines };
  });

test("gross of random structures is 7 x the column of (I - N)^-1 (COMPUTED: mathjs)", () => {
  fc.assert(
    fc.property(acyclic, (shop) => {
      const total = Object.entries(totalRequirements(shop, "P0")).map(([name, each]) => [name, 7 * each]);
      expect(pick(shop, "gross")).toEqual(Object.fromEntries(total));
    }),
    { numRuns: 100, seed: 20261201 },
  );
});

test("chain (READ: Ptak and Smith, Orlicky's Material Requirements Planning, 3rd ed. 2011, pp. 104-105)", () => {
  const stock = [buildStock("A", "2"), buildStock("B", "15"), buildStock("C", "7"), buildStock("D", "46")];
  const shop = buildShop("X = 1 A\nA = 1 B\nB = 1 C\nC = 1 D", { stock, demand: [buildDemand("X", "100")] });
  expect(pick(shop, "net")).toEqual({ X: 100, A: 98, B: 83, C: 76, D: 30 });
});

describe("scrap by percentage (MEMORY for a book; arithmetic): 100 good at 5 % is 106", () => {
  test("as scrap on the line", () => {
    const shop = buildShop("kit = 1 pin", { demand: [buildDemand("kit", "100")] });
    shop.lines[0].scrap = "0.05";
    expect(figures(shop).pin).toEqual({ gross: 106, net: 106 });
  });

  test("as yield of the made part", () => {
    const demand = [buildDemand("kit", "100")];
    const shop = buildShop("kit = 1 pin\npin = 1 wire", { demand, parts: { pin: { yield: "0.95" } } });
    expect(figures(shop).pin).toEqual({ gross: 100, net: 106 });
    expect(figures(shop).wire.gross).toBe(106);
  });
});

test("two-stage matrix (READ: worked exercise at mathelounge.de/705371)", () => {
  const first = [
    [5, 8, 1],
    [4, 0, 6],
    [2, 11, 3],
  ];
  const second = [
    [2, 9, 0],
    [12, 7, 5],
    [1, 3, 6],
  ];
  const product = [
    [107, 104, 46],
    [14, 54, 36],
    [139, 104, 73],
  ];
  const lines = [0, 1, 2].flatMap((row) =>
    [0, 1, 2].flatMap((column) => [
      buildLine({ parent: `Z${column}`, component: `R${row}`, quantity: String(first[row][column]) }),
      buildLine({ parent: `E${column}`, component: `Z${row}`, quantity: String(second[row][column]) }),
    ]),
  );
  const made = ["Z0", "Z1", "Z2", "E0", "E1", "E2"].map((partNumber) =>
    buildPart({ partNumber, sourcing: "make" }),
  );
  const bought = ["R0", "R1", "R2"].map((partNumber) => buildPart({ partNumber }));
  const columns = [0, 1, 2].map((column) => {
    const shop = {
      ...buildShop("", { demand: [buildDemand(`E${column}`, "1")] }),
      parts: [...made, ...bought],
      lines,
    };
    return ["R0", "R1", "R2"].map((partNumber) => figures(shop)[partNumber].gross);
  });
  expect([0, 1, 2].map((row) => columns.map((column) => column[row]))).toEqual(product);
});
