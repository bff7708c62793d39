import { compileStructure } from "~/domain/planning/compile-structure";
import { compileSupplies } from "~/domain/planning/compile-supplies";
import { planShip } from "~/domain/planning/plan-ship";
import type { Structure } from "~/domain/planning/structure/structure";
import { bestTime } from "./support/best-time";
import { report } from "./support/figure";
import { generateShop } from "./support/generated-shop";
import { openPass, plainDemand } from "./support/open-pass";

/** The core alone on a structure of a million parts, and how its cost a line grows up to there. */
const small = measurePass(1_000, 2_700, 2_000);
const { structure, supplies, compile, supply } = compileShop(1_000_000, 2_800_000);
const ladder = bestTime(1, () => {
  const result = planShip({ structure, supplies, demand: [plainDemand("P-0", 10)], sharing: "strict" });
  if (!result.ok || result.plan.served.rungs.length !== 10) throw new Error("There is no ladder to ten.");
});
const pass = timePass(structure, supplies, 10);
const size = "1,000,000 parts, 2,800,000 lines";

report([
  { name: `${size}: compile`, value: compile / 1000, unit: "s", target: { most: 3 } },
  { name: `${size}: lay out stock`, value: supply / 1000, unit: "s" },
  { name: `${size}: netting pass`, value: pass.pass, unit: "ms", note: `${pass.needed} parts needed` },
  {
    name: `${size}: netting pass against a streaming read`,
    value: pass.pass / pass.read,
    unit: "times",
    target: { most: 6 },
  },
  { name: `${size}: ladder to ten`, value: ladder / 1000, unit: "s", target: { most: 2.5 } },
  {
    name: `${size}: memory at most`,
    value: process.resourceUsage().maxRSS / 1024,
    unit: "MB",
    target: { most: 1024 },
    note: "with the rows that it was compiled from",
  },
  {
    name: "Cost a line, 2,800,000 lines against 2,700",
    value: pass.pass / 2_800_000 / (small.pass / 2_700),
    unit: "times",
    target: { most: 4 },
  },
]);

function compileShop(parts: number, lines: number) {
  const shop = generateShop(parts, lines);
  let begin = performance.now();
  const compiled = compileStructure(shop.parts, shop.lines);
  const compile = performance.now() - begin;
  if (!compiled.ok) throw new Error(compiled.problems[0].code);
  begin = performance.now();
  const supplies = compileSupplies(compiled.structure, shop.stock, [], "2026-12-01");
  return { structure: compiled.structure, supplies, compile, supply: performance.now() - begin };
}

function measurePass(parts: number, lines: number, runs: number) {
  const { structure, supplies } = compileShop(parts, lines);
  return timePass(structure, supplies, runs);
}

function timePass(structure: Structure, supplies: ReturnType<typeof compileSupplies>, runs: number) {
  const { run, lane, offer } = openPass(structure, supplies, "P-0");
  run(10);
  const pass = bestTime(runs, () => run(10));
  const { fixed, leaf, sourcing, open, yieldNum, yieldDen } = structure;
  const { gross } = lane.next;
  const lines = [fixed.component, fixed.num, fixed.den] as ArrayLike<number>[];
  const base = [lane.state.gross, lane.state.fromStock, lane.state.net] as ArrayLike<number>[];
  const parts = [fixed.starts, leaf, sourcing, open, yieldNum, yieldDen, offer.stock] as ArrayLike<number>[];
  const arrays = [...lines, ...base, ...parts, gross as ArrayLike<number>];
  const read = bestTime(runs, () => arrays.reduce((sum, array) => sum + sumUp(array), 0));
  let needed = 0;
  for (let p = 0; p < gross.length; p++) if (gross[p] > 0) needed++;
  if (needed !== gross.length) throw new Error(`Only ${needed} parts are needed.`);
  return { pass, read, needed };
}

function sumUp(array: ArrayLike<number>): number {
  if (array instanceof Float64Array) return sumDoubles(array);
  return array instanceof Int32Array ? sumWords(array) : sumBytes(array as Uint8Array);
}

// One function for each kind of array, so that each one is compiled for it.
function sumDoubles(array: Float64Array): number {
  let sum = 0;
  for (let at = 0; at < array.length; at++) sum += array[at];
  return sum;
}

function sumWords(array: Int32Array): number {
  let sum = 0;
  for (let at = 0; at < array.length; at++) sum += array[at];
  return sum;
}

function sumBytes(array: Uint8Array): number {
  let sum = 0;
  for (let at = 0; at < array.length; at++) sum += array[at];
  return sum;
}
