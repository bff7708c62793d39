import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { balanceKey, compareBalances } from "~/domain/stock/balance-key";
import type { BinLeg } from "~/domain/stock/leg";
import { settleLegs } from "~/domain/stock/settle-legs";
import { STORED_LIMIT } from "~/domain/stock/stored-decimals";

const leg = (quantity: bigint, binId = 1): BinLeg => ({
  partId: 1,
  lotId: 1,
  binId,
  place: "bin",
  state: "usable",
  quantity,
});
const balances = (...quantities: bigint[]) =>
  new Map(quantities.map((quantity, index) => [balanceKey(leg(0n, index + 1)), { quantity, sequence: 10 }]));

describe("settleLegs", () => {
  it("numbers the legs of each balance and sums their changes", () => {
    const settled = settleLegs([leg(5n), leg(-2n, 2), leg(-7n)], balances(2n, 2n));
    expect(settled).toEqual({
      ok: true,
      sequences: [11, 11, 12],
      changes: new Map([
        [balanceKey(leg(0n, 1)), { change: -2n, legs: 2 }],
        [balanceKey(leg(0n, 2)), { change: -2n, legs: 1 }],
      ]),
    });
  });

  it("names every leg that there is not enough for, with what was there at its turn", () => {
    const settled = settleLegs([leg(-3n), leg(-3n), leg(-1n), leg(-1n)], balances(5n));
    expect(settled).toEqual({
      ok: false,
      refused: [{ leg: 1, code: "not-enough", onHand: 2n }],
    });
  });

  it("refuses to pass what can be stored", () => {
    const settled = settleLegs([leg(1n)], balances(STORED_LIMIT - 1n));
    expect(settled).toMatchObject({ ok: false, refused: [{ code: "too-much" }] });
  });

  it("says that a balance is missing rather than taking it for empty", () => {
    expect(() => settleLegs([leg(1n, 9)], balances(1n))).toThrow("No balance");
  });

  it("agrees with a plain running sum on any legs", () => {
    const anyLeg = fc.record({
      bin: fc.integer({ min: 1, max: 3 }),
      quantity: fc.bigInt({ min: -20n, max: 20n }),
    });
    fc.assert(
      fc.property(fc.array(anyLeg, { maxLength: 30 }), (steps) => {
        const start = [15n, 0n, 40n];
        const running = [...start];
        const enough = steps.every(({ bin, quantity }) => {
          running[bin - 1] += quantity;
          return running[bin - 1] >= 0n;
        });
        const settled = settleLegs(
          steps.map(({ bin, quantity }) => leg(quantity, bin)),
          balances(...start),
        );
        expect(settled.ok).toBe(enough);
        if (!settled.ok) return;
        const ends = start.map(
          (quantity, index) => quantity + (settled.changes.get(balanceKey(leg(0n, index + 1)))?.change ?? 0n),
        );
        expect(ends).toEqual(running);
      }),
    );
  });
});

describe("compareBalances", () => {
  it("orders by part, bin, lot and state", () => {
    const place = (partId: number, binId: number, lotId: number, state: BinLeg["state"]) => ({
      partId,
      binId,
      lotId,
      state,
    });
    const ordered = [
      place(1, 9, 9, "usable"),
      place(2, 1, 9, "usable"),
      place(2, 10, 1, "usable"),
      place(2, 10, 2, "held"),
      place(2, 10, 2, "usable"),
    ];
    expect([...ordered].reverse().sort(compareBalances)).toEqual(ordered);
  });
});
