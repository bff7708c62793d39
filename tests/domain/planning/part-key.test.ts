import { expect, test } from "vitest";
import { partKey } from "~/domain/planning/part-key";

test.each([
  ["BU-100", "BU-100"],
  ["bu-100", "BU-100"],
  [" BU-100\t", "BU-100"],
  ["BU 100", "BU 100"],
  ["e\u0301", "\u00c9"],
  ["\u00e9", "\u00c9"],
  ["straße", "STRASSE"],
  ["", ""],
])("%j is %j", (text, key) => {
  expect(partKey(text)).toBe(key);
  expect(partKey(key)).toBe(key);
});

test.each([
  ["007", "7"],
  ["A", "\u00c1"],
  ["A-1", "A1"],
])("%j and %j are different parts", (one, other) => {
  expect(partKey(one)).not.toBe(partKey(other));
});
