import { describe, expect, it } from "vitest";
import { formatStored } from "~/domain/stock/format-stored";
import { makeLegs } from "~/domain/stock/make-legs";
import { parseStored } from "~/domain/stock/parse-stored";
import type { PostedKind } from "~/domain/stock/types";

describe("stored quantities", () => {
  it.each([
    ["0.350000", 350_000n],
    ["-12.5", -12_500_000n],
    ["99999999999999.999999", 99_999_999_999_999_999_999n],
  ])("reads %s exactly and writes it back", (text, millionths) => {
    expect(parseStored(text)).toBe(millionths);
    expect(parseStored(formatStored(millionths))).toBe(millionths);
  });

  it("writes with the part's decimals and never cuts a digit off", () => {
    expect(formatStored(12_000_000n, 0)).toBe("12");
    expect(formatStored(-350_000n, 3)).toBe("-0.350");
    expect(formatStored(1_500_000n, 0)).toBe("1.500000");
  });
});

describe("makeLegs", () => {
  const from = { binId: 3, state: "usable" as const };
  const to = { binId: 4, state: "held" as const };

  it.each<[PostedKind, "from" | "to" | "both", string[]]>([
    ["receive", "to", ["supplier", "bin"]],
    ["return", "to", ["in-work", "bin"]],
    ["issue", "from", ["bin", "in-work"]],
    ["scrap", "from", ["bin", "scrap"]],
    ["adjust", "from", ["bin", "adjustment"]],
    ["adjust", "to", ["adjustment", "bin"]],
    ["hold", "both", ["bin", "bin"]],
  ])("%s (%s) has two legs that sum to zero, at their places", (kind, sides, places) => {
    const legs = makeLegs({
      kind,
      partId: 1,
      lotId: 2,
      quantity: 7n,
      from: sides === "to" ? null : from,
      to: sides === "from" ? null : to,
    });
    expect(legs.map((leg) => leg.place)).toEqual(places);
    expect(legs.map((leg) => leg.quantity)).toEqual([-7n, 7n]);
  });
});
