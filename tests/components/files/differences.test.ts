import { describe, expect, it } from "vitest";
import { differences } from "~/components/files/differences";
import { sayCounts } from "~/components/files/say-counts";

describe("differences", () => {
  it("names what changes, field by field", () => {
    const before = { partNumber: "HB-2041", leadTimeDays: 10, unitCost: null, sold: false };
    const after = { partNumber: "HB-2041", leadTimeDays: 12, unitCost: "0.250", sold: false };
    expect(differences({ before, after })).toEqual({
      name: "HB-2041",
      changes: [
        { field: "lead time days", before: "10", after: "12" },
        { field: "unit cost", before: "nothing", after: "0.250" },
      ],
    });
  });

  it("lists what a new row brings", () => {
    const after = { parent: "KIT", component: "BOLT", quantity: "4", option: null };
    expect(differences({ before: null, after })).toEqual({
      name: "KIT",
      changes: [
        { field: "component", before: null, after: "BOLT" },
        { field: "quantity", before: null, after: "4" },
      ],
    });
  });
});

describe("sayCounts", () => {
  it("says what is wrong first and leaves out what is not there", () => {
    const counts = { refused: 1, new: 1_200, changed: 0, same: 3, removed: 1 };
    expect(sayCounts({ counts, rows: [{} as never] })).toBe(
      "1 refused, 1,200 new, 1 line removed, 3 unchanged.",
    );
    expect(sayCounts({ counts: { refused: 0, new: 0, changed: 0, same: 0, removed: 0 }, rows: [] })).toBe(
      "The file has a header and no rows.",
    );
  });
});
