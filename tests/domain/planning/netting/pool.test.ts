import { describe, expect, test } from "vitest";
import {
  available,
  type Bucket,
  copyLeft,
  fullBuckets,
  type Pool,
  takeFrom,
} from "~/domain/planning/netting/pool";
import { numberEngine } from "~/domain/planning/netting/run-pass";
import { wideEngine } from "~/domain/planning/netting/run-wide-pass";

const bucket = (day: number, quantity: number): Bucket => ({ day, quantity, flag: null, row: 0 });
const always = () => true;

/** Part 0 has 10 that never expire, part 1 two lots, part 2 nothing. */
const pool = (): Pool => ({
  totals: Float64Array.of(10, 7, 0),
  buckets: new Map([[1, [bucket(100, 3), bucket(200, 4)]]]),
});

describe.each([
  ["doubles", numberEngine],
  ["BigInt", wideEngine],
])("available in %s", (_, engine) => {
  const amounts = (used: number[], admits: (day: number) => boolean, left = fullBuckets(pool())) =>
    Array.from(available(pool(), left, used.map(engine.from), engine, admits) as ArrayLike<number>, Number);

  test("is the total less what is used, where no day matters", () => {
    expect(amounts([4, 0, 0], always)).toEqual([6, 7, 0]);
  });

  test("counts the lots whose day is admitted", () => {
    expect(amounts([0, 0, 0], (day) => day >= 150)).toEqual([10, 4, 0]);
    expect(amounts([0, 0, 0], (day) => day >= 201)).toEqual([10, 0, 0]);
  });

  test("goes by what is left in the lots, not by what is used in all", () => {
    const left = new Map([[1, [1, 4]]]);
    expect(amounts([0, 6, 0], always, left)).toEqual([10, 5, 0]);
  });
});

describe("takeFrom", () => {
  const take = (before: number, after: number, admits: (day: number) => boolean) => {
    const left = fullBuckets(pool());
    takeFrom(pool(), left, [0, before, 0], [5, after, 0], admits);
    return left.get(1);
  };

  test.each([
    [0, 0, always, [3, 4]],
    [0, 2, always, [1, 4]],
    [0, 5, always, [0, 2]],
    [5, 7, always, [1, 4]],
    [0, 4, (day: number) => day >= 150, [3, 0]],
  ])("from %i to %i", (before, after, admits, left) => {
    expect(take(before, after, admits)).toEqual(left);
  });
});

test("a copy of what is left stands by itself", () => {
  const left = fullBuckets(pool());
  const copy = copyLeft(left);
  takeFrom(pool(), left, [0, 0, 0], [0, 7, 0], always);
  expect(left.get(1)).toEqual([0, 0]);
  expect(copy.get(1)).toEqual([3, 4]);
});
