import { expect, test } from "vitest";
import { treeShape, visibleRows } from "~/components/structure/visible-rows";
import type { StructurePart, StructureRow } from "~/schemas/parts/structure-plan";

const part = (partNumber: string, missing: string | null): StructurePart => ({
  partNumber,
  description: `${partNumber} words`,
  unit: "EA",
  decimals: 0,
  sourcing: "make",
  needed: "1",
  fromStock: "0",
  built: null,
  missing,
  places: 1,
});
const parts = [
  part("KIT", null),
  part("DRIVE", null),
  part("BOLT", "2"),
  part("BOX", null),
  part("TAPE", "0"),
];
const rows = [
  [1, 0],
  [2, 1],
  [3, 2],
  [2, 3],
  [3, 4],
].map(([level, at]) => ({ level, part: at }) as StructureRow);
const shape = treeShape(rows, parts);
const show = (wanted: Partial<Parameters<typeof visibleRows>[3]>) =>
  visibleRows(rows, parts, shape, { open: new Set(), onlyMissing: false, words: "", ...wanted });

test("a closed branch hides what is below it", () => {
  expect(show({})).toEqual([0]);
  expect(show({ open: new Set([0]) })).toEqual([0, 1, 3]);
  expect(show({ open: new Set([0, 3]) })).toEqual([0, 1, 3, 4]);
});

test("only what leads to a missing part is kept", () => {
  expect(show({ open: new Set([0, 1, 2, 3]), onlyMissing: true })).toEqual([0, 1, 2]);
});

test("words keep the rows that have them and all above them", () => {
  expect(show({ words: "tape" })).toEqual([0, 3, 4]);
  expect(show({ words: "nothing" })).toEqual([]);
});

test("each row knows what stands above it and where it ends", () => {
  expect([...shape.parent]).toEqual([-1, 0, 1, 0, 3]);
  expect([...shape.end]).toEqual([5, 3, 3, 5, 5]);
});
