import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { ladderRows } from "~/components/check/ladder-rows";
import { keepDrawnRungs } from "~/domain/planning/ladder-runs";
import type { Rung } from "~/domain/planning/types";
import { buildCheckAnswer } from "../../support/build-check-answer";

function rowsOf(quantity: number, stopsAt: number[], keep = (ladder: Rung[]) => ladder) {
  const scarce = stopsAt.map((kit, place) => ({ partNumber: `P-${place}`, stopsAt: kit, perKit: 1 }));
  const page = buildCheckAnswer({ quantity, scarce });
  return ladderRows(keep(page.answer?.ladder ?? []), page.stoppers);
}

describe("the rows of the ladder", () => {
  test("up to twelve kits have a row each", () => {
    const rows = rowsOf(12, [8, 10]);
    expect(rows.map((row) => [row.from, row.to])).toEqual(
      Array.from({ length: 12 }, (_, place) => [place + 1, place + 1]),
    );
    expect(rows.filter((row) => row.ready)).toHaveLength(7);
  });

  test("a row shows first what stops no kit below it", () => {
    const rows = rowsOf(10, [8, 10]);
    expect(rows[7].fresh).toEqual([{ partNumber: "P-0", missing: "1" }]);
    expect(rows[8].fresh).toEqual([]);
    expect(rows[8].carried).toEqual([{ partNumber: "P-0", missing: "2" }]);
    expect(rows[9].fresh.map((one) => one.partNumber)).toEqual(["P-1"]);
  });

  test("more kits are drawn as runs that stand or fall together", () => {
    const rows = rowsOf(1000, [71, 400]);
    expect(rows.map((row) => [row.from, row.to, row.ready])).toEqual([
      [1, 70, true],
      [71, 399, false],
      [400, 1000, false],
    ]);
    expect(rows[2].fresh).toEqual([{ partNumber: "P-1", missing: "601" }]);
  });

  test("runs never are more than twelve, leave no kit out and name each part once as new", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 120 }),
        fc.array(fc.integer({ min: 1, max: 120 }), { maxLength: 40 }),
        (quantity, stopsAt) => {
          const rows = rowsOf(quantity, stopsAt);
          expect(rows.length).toBeLessThanOrEqual(12);
          expect(rows[0].from).toBe(1);
          expect(rows.at(-1)?.to).toBe(quantity);
          for (let place = 1; place < rows.length; place++)
            expect(rows[place].from).toBe(rows[place - 1].to + 1);
          const fresh = rows.flatMap((row) => row.fresh.map((one) => one.partNumber));
          expect(fresh).toHaveLength(new Set(fresh).size);
          expect(rowsOf(quantity, stopsAt, keepDrawnRungs)).toEqual(rows);
          expect(fresh).toHaveLength(stopsAt.filter((kit) => kit <= quantity).length);
        },
      ),
    );
  });
});
