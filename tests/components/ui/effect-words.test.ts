import { describe, expect, test } from "vitest";
import { effectWords } from "~/components/ui/effect-words";
import type { EffectsAnswer, PlannedKitOrder, ShipLineState } from "~/schemas/planning/effects";

const waits = (kitOrder: string, partNumber = "HB-2041"): PlannedKitOrder => ({
  kitOrder,
  partNumber: "S2",
  isReady: false,
  stoppers: [{ partNumber, missing: "2" }],
  readyOn: "2027-03-14",
});
const ready = (kitOrder: string): PlannedKitOrder => ({ ...waits(kitOrder), isReady: true, stoppers: [] });

const line = (rest: Partial<ShipLineState> = {}): ShipLineState => ({
  ready: 6,
  of: 10,
  next: waits("KO-0157"),
  allBy: "2027-02-02",
  ...rest,
});

function answer(rest: Partial<EffectsAnswer> = {}): EffectsAnswer {
  return {
    today: "2026-12-01",
    revision: 1,
    before: line(),
    after: line(),
    becomeReady: [],
    stop: [],
    own: [],
    ...rest,
  };
}

function said(rest: Partial<EffectsAnswer>): string {
  const { shape, words } = effectWords(answer(rest));
  return `${shape}: ${words.map((word) => word.text).join("")}`;
}

describe("what an act does to the ship line, in words", () => {
  test("nothing", () => {
    expect(said({})).toBe("same: Nothing changes on the ship line: 6 of 10 ready.");
  });

  test("a kit that stops, by which part, and the day all can go", () => {
    const after = line({ ready: 5, next: waits("KO-0151"), allBy: "2027-03-14" });
    expect(said({ after, stop: [waits("KO-0151")] })).toBe(
      "stops: Ship line 6 → 5 of 10 ready. KO-0151 would stop at HB-2041, 2 missing. All ten by 14 March instead of 2 February.",
    );
  });

  test("only what stops kits is marked so", () => {
    const after = line({ ready: 5, next: waits("KO-0151") });
    const marked = (rest: Partial<EffectsAnswer>) =>
      effectWords(answer(rest))
        .words.filter((word) => word.stops)
        .map((word) => word.text)
        .join("");
    expect(marked({ after, stop: [waits("KO-0151")] })).toBe("KO-0151 would stop at HB-2041, 2 missing.");
    expect(marked({ own: [{ kitOrder: "KO-0159", place: 13, planned: waits("KO-0159") }] })).toBe("");
  });

  test("several kits that stop, and several parts", () => {
    const first = { ...waits("KO-0151"), stoppers: [...waits("").stoppers, ...waits("", "CL-1").stoppers] };
    expect(said({ after: line({ ready: 4 }), stop: [first, waits("KO-0152")] })).toBe(
      "stops: Ship line 6 → 4 of 10 ready. KO-0151 would stop at HB-2041, 2 missing, and one other part, and one more after it.",
    );
  });

  test("kits that become ready", () => {
    const after = line({ ready: 8 });
    expect(said({ after, becomeReady: ["KO-0157", "KO-0158"] })).toBe(
      "helps: Ship line 6 → 8 of 10 ready. KO-0157 and one more would become ready.",
    );
    const all = line({ ready: 10, next: null, allBy: "2026-12-01" });
    expect(said({ after: all, becomeReady: ["KO-0157"] })).toBe(
      "helps: Ship line 6 → 10 of 10 ready. KO-0157 would become ready.",
    );
  });

  test.each([
    [ready("KO-0159"), 4, "KO-0159 would be fourth and ready."],
    [waits("KO-0159"), 4, "KO-0159 would be fourth and wait for HB-2041, 2 missing, until 14 March."],
    [ready("KO-0159"), 13, "KO-0159 would be 13th, after the ship line, and ready."],
    [null, 75, "KO-0159 would be 75th, after the ship line."],
  ])("the form's own order, %#", (planned, place, sentence) => {
    expect(said({ own: [{ kitOrder: "KO-0159", place, planned }] })).toBe(
      `moves: Ship line stays at 6 of 10 ready. ${sentence}`,
    );
  });

  test("the form's own order is spoken of once", () => {
    const own = [{ kitOrder: "KO-0151", place: 1, planned: ready("KO-0151") }];
    expect(said({ after: line({ ready: 7 }), becomeReady: ["KO-0151"], own })).toBe(
      "helps: Ship line 6 → 7 of 10 ready. KO-0151 would become ready.",
    );
  });

  test("another order or part that is the first to wait", () => {
    expect(said({ after: line({ next: waits("KO-0157", "CL-1114") }) })).toBe(
      "moves: Ship line stays at 6 of 10 ready. KO-0157 would be the first to wait, for CL-1114, 2 missing.",
    );
  });

  test("a line that grows, and one that ends", () => {
    const before = line({ ready: 2, of: 2, next: null });
    expect(said({ before, after: line({ ready: 3, of: 3, next: null }) })).toBe(
      "moves: Ship line 2 of 2 → 3 of 3 ready.",
    );
    const none = line({ ready: 0, of: 0, next: null, allBy: null });
    expect(said({ before, after: none })).toBe("moves: No kit order would be open.");
    expect(said({ before: none, after: line({ ready: 1, of: 1, next: null }) })).toBe(
      "moves: Ship line: 1 of 1 ready.",
    );
  });
});
