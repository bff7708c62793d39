import { describe, expect, it } from "vitest";
import { checkMovement } from "~/domain/stock/check-movement";
import type { BalanceState, MovementRequest, PostedKind } from "~/domain/stock/types";

const NOW = Date.parse("2026-12-01T12:00:00Z");
const KINDS: PostedKind[] = ["receive", "return", "issue", "scrap", "move", "hold", "release", "adjust"];
const STATES: BalanceState[] = ["usable", "held", "staged", "with-supplier"];

const build = (overrides: Partial<MovementRequest>): MovementRequest => ({
  kind: "receive",
  partNumber: "HB-2041",
  quantity: "1",
  reason: "why not",
  ...overrides,
});
const side = (state: BalanceState, bin = "A12") => ({ bin, state });
const fieldsOf = (overrides: Partial<MovementRequest>) =>
  checkMovement(build(overrides), NOW).map(({ field }) => field);

/** Kind by the sides that it may name. */
const SIDES: Record<PostedKind, string[]> = {
  receive: ["to"],
  return: ["to"],
  issue: ["from"],
  scrap: ["from"],
  move: ["both"],
  hold: ["both"],
  release: ["both"],
  adjust: ["from", "to"],
};

/** Kind by the states that it may take from and bring to, in the words from>to. */
const ALLOWED: Record<PostedKind, (from: BalanceState, to: BalanceState) => boolean> = {
  receive: (_from, to) => to === "usable" || to === "held",
  return: (_from, to) => to === "usable" || to === "held",
  issue: (from) => from === "usable" || from === "staged",
  scrap: () => true,
  move: (from, to) => (from === "held") === (to === "held"),
  hold: (from, to) => (from === "usable" || from === "staged") && to === "held",
  release: (from, to) => from === "held" && to === "usable",
  adjust: () => true,
};

describe("checkMovement", () => {
  it.each(KINDS)("lets %s name only its own sides", (kind) => {
    const from = side(kind === "release" ? "held" : "usable");
    const to = side(kind === "hold" ? "held" : "usable", "A21");
    const given = { none: {}, from: { from }, to: { to }, both: { from, to } };
    const accepted = Object.entries(given).filter(([, sides]) => fieldsOf({ kind, ...sides }).length === 0);
    expect(accepted.map(([name]) => name)).toEqual(SIDES[kind]);
  });

  it.each(KINDS)("lets %s take and bring only its own states", (kind) => {
    const sides = SIDES[kind][0];
    for (const from of STATES) {
      for (const to of STATES) {
        const movement = {
          kind,
          from: sides === "to" ? null : side(from),
          to: sides === "from" ? null : side(to, "A21"),
        };
        expect({ from, to, ok: fieldsOf(movement).length === 0 }).toEqual({
          from,
          to,
          ok: ALLOWED[kind](from, to),
        });
      }
    }
  });

  it("refuses a move to the same place, however the bin is written", () => {
    expect(fieldsOf({ kind: "move", from: side("usable"), to: side("usable", " a12 ") })).toEqual(["to"]);
    expect(fieldsOf({ kind: "move", from: side("usable"), to: side("staged") })).toEqual([]);
  });

  it("wants a reason for an adjustment alone", () => {
    for (const reason of [undefined, null, "", "  "]) {
      expect(fieldsOf({ kind: "adjust", to: side("usable"), reason })).toEqual(["reason"]);
      expect(fieldsOf({ to: side("usable"), reason })).toEqual([]);
    }
  });

  it.each([
    ["2026-12-01T12:04:59Z", true],
    ["2026-12-01T13:04:00+01:00", true],
    ["2026-12-01T12:06:00Z", false],
    ["2026-12-01", false],
    ["2026-12-01T12:00:00", false],
    ["2026-13-01T12:00:00Z", false],
    ["yesterday", false],
  ])("takes the moment %s: %s", (happenedAt, ok) => {
    expect(fieldsOf({ to: side("usable"), happenedAt })).toEqual(ok ? [] : ["happenedAt"]);
  });

  it("keeps texts to what can be stored", () => {
    const to = side("usable");
    expect(
      fieldsOf({ to, reason: "x".repeat(500), reference: "x".repeat(120), lot: "x".repeat(80) }),
    ).toEqual([]);
    expect(
      fieldsOf({ to, reason: "x".repeat(501), reference: "x".repeat(121), lot: "x".repeat(81) }),
    ).toEqual(["reason", "reference", "lot"]);
  });
});
