import { describe, expect, test } from "vitest";
import { keepDrawnRungs, ladderRuns } from "~/domain/planning/ladder-runs";
import type { Rung } from "~/domain/planning/types";

/** A ladder whose rungs have so many stoppers each. */
const ladder = (counts: number[]): Rung[] =>
  counts.map((count, at) => ({
    partNumber: "K",
    kits: at + 1,
    cost: null,
    readyOn: "2026-12-01",
    stoppers: Array.from({ length: count }, (_, n) => ({ partNumber: `P${n}`, missing: "1" })),
  }));

const runsOf = (rungs: Rung[]) => ladderRuns(rungs).map(({ from, top }) => [from, top.kits]);

/** From 1 to `last`, growing by one stopper every `step` kits. */
const stairs = (last: number, step: number) =>
  ladder(Array.from({ length: last }, (_, at) => Math.floor(at / step)));

describe("ladderRuns", () => {
  test.each<[string, Rung[], number[][]]>([
    ["no rung", [], []],
    ["twelve rungs have one each", stairs(12, 6), Array.from({ length: 12 }, (_, at) => [at + 1, at + 1])],
    [
      "thirteen stand together by their stoppers",
      stairs(13, 6),
      [
        [1, 6],
        [7, 12],
        [13, 13],
      ],
    ],
    [
      "the twelfth run takes all above",
      stairs(100, 1),
      [...Array.from({ length: 11 }, (_, at) => [at + 1, at + 1]), [12, 100]],
    ],
    ["nothing missing is one run", ladder(new Array(50).fill(0)), [[1, 50]]],
  ])("%s", (_, rungs, runs) => {
    expect(runsOf(rungs)).toEqual(runs);
  });
});

describe("keepDrawnRungs", () => {
  test("keeps the top of each run and the first that cannot be climbed", () => {
    expect(keepDrawnRungs(stairs(40, 10)).map(({ kits }) => kits)).toEqual([10, 11, 20, 30, 40]);
  });

  test.each([stairs(40, 10), stairs(100, 1), stairs(12, 6), stairs(1000, 7)])(
    "gives the same runs as the whole ladder",
    (...rungs) => {
      expect(runsOf(keepDrawnRungs(rungs))).toEqual(runsOf(rungs));
    },
  );
});
