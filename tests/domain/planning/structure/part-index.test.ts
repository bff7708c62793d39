import { expect, test } from "vitest";
import { PartIndex } from "~/domain/planning/structure/part-index";

test("finds every key by its number, and no other", () => {
  const index = new PartIndex(5000);
  for (let at = 0; at < 5000; at++) expect(index.add(`P-${at}`)).toBe(true);
  for (let at = 0; at < 5000; at++) expect(index.find(`P-${at}`)).toBe(at);
  expect([index.find("P-5000"), index.find(""), index.find("p-1")]).toEqual([-1, -1, -1]);
});

test("a key that is there already keeps its number, and the next key its own", () => {
  const index = new PartIndex(3);
  expect([index.add("A"), index.add("A"), index.add("B")]).toEqual([true, false, true]);
  expect([index.find("A"), index.find("B")]).toEqual([0, 2]);
});

test("an empty one finds nothing", () => {
  expect(new PartIndex(0).find("A")).toBe(-1);
});
