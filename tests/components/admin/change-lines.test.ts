import { expect, it } from "vitest";
import { changeLines } from "~/components/admin/change-lines";

it("says what changed, and leaves out what stayed", () => {
  const before = JSON.stringify({ lotMinimum: "5", roles: ["clerk"], sold: true, name: "Bolt" });
  const after = JSON.stringify({ lotMinimum: "10", roles: ["clerk", "builder"], sold: false, name: "Bolt" });
  expect(changeLines(before, after)).toEqual([
    { name: "lot minimum", before: "5", after: "10" },
    { name: "roles", before: "clerk", after: "clerk, builder" },
    { name: "sold", before: "yes", after: "no" },
  ]);
});

it("takes one side alone, nested values, lists and what is no object", () => {
  expect(changeLines(null, JSON.stringify({ unit_cost: null, lines: [{ a: 1 }], tags: [] }))).toEqual([
    { name: "unit cost", before: null, after: "nothing" },
    { name: "lines", before: null, after: '[{"a":1}]' },
    { name: "tags", before: null, after: "nothing" },
  ]);
  expect(changeLines('"old"', '"new"')).toEqual([{ name: "value", before: "old", after: "new" }]);
  expect(changeLines(null, null)).toEqual([]);
  expect(changeLines("no json", null)).toEqual([{ name: "value", before: "no json", after: null }]);
});
