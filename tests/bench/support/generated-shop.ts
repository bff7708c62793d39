import type { PlanLine, PlanPart, PlanStock } from "~/domain/planning/types";

const FAMILY = 1000;

interface GeneratedShop {
  parts: PlanPart[];
  lines: PlanLine[];
  stock: PlanStock[];
}

/**
 * A kit of so many parts and lines in which every part is needed. Three parts in ten are made, four to a parent at the
 * most, each used once; all other lines take 1 to 4 of a bought part, so that needs stay small. Nine in ten bought parts
 * belong to a family of a thousand made ones, as those of one product do, the tenth goes anywhere, as fasteners do. Stock
 * covers ten kits, but for one bought part in a thousand. Lines come parent by parent, as in a file.
 */
export function generateShop(partCount: number, lineCount: number): GeneratedShop {
  const random = makeRandom(7);
  const makes = Math.floor(partCount * 0.3);
  const names = Array.from({ length: partCount }, (_, at) => `P-${at}`);
  const parent = new Int32Array(lineCount);
  const component = new Int32Array(lineCount);
  for (let line = 0; line < lineCount; line++) {
    const at = line + 1;
    component[line] = at < partCount ? at : makes + Math.floor(random() * (partCount - makes));
    if (at < makes) parent[line] = Math.floor((at - 1) / 4);
    else if (random() < 0.1) parent[line] = Math.floor(random() * makes);
    else {
      const home = ((component[line] - makes) / (partCount - makes)) * makes;
      parent[line] = Math.min(makes - 1, Math.max(0, Math.floor(home + (random() - 0.5) * FAMILY)));
    }
  }
  // A made part without lines would be one that nobody makes.
  for (let make = 0; make < makes; make++) {
    component[partCount + make] = makes + Math.floor((make / makes) * (partCount - makes));
    parent[partCount + make] = make;
  }
  const perKit = new Int32Array(partCount);
  const lines = Array.from(byParent(parent, makes), (line): PlanLine => {
    const pieces = component[line] < makes ? 1 : 1 + (line % 4);
    perKit[component[line]] += pieces;
    return {
      parent: names[parent[line]],
      component: names[component[line]],
      quantity: String(pieces),
      scrap: "0",
      option: null,
      fromSerial: null,
      toSerial: null,
      fromDate: null,
      toDate: null,
    };
  });
  const parts = names.map((name, at) => makePart(name, at, at < makes));
  const stock = names.slice(makes).map((partNumber, at): PlanStock => {
    const kits = at % 1000 === 0 ? (at / 1000) % 10 : 10;
    return { partNumber, quantity: String(perKit[makes + at] * kits), expiresOn: null };
  });
  return { parts, lines, stock };
}

function makePart(partNumber: string, at: number, isMade: boolean): PlanPart {
  return {
    partNumber,
    sourcing: isMade ? "make" : "buy",
    unit: "EA",
    decimals: 0,
    leadTimeDays: (at * 7) % 90,
    yield: "1",
    unitCost: "1.25",
    massKg: null,
  };
}

/** Line numbers, those of one parent together. */
function byParent(parent: Int32Array, parents: number): Int32Array {
  const next = new Int32Array(parents + 1);
  for (const one of parent) next[one + 1]++;
  for (let at = 0; at < parents; at++) next[at + 1] += next[at];
  const sorted = new Int32Array(parent.length);
  for (let line = 0; line < parent.length; line++) sorted[next[parent[line]]++] = line;
  return sorted;
}

/** The same numbers from 0 to 1 every time (mulberry32). */
function makeRandom(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
}
