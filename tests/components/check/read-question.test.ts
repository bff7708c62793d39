import { describe, expect, test } from "vitest";
import { checkSearch } from "~/components/check/check-search";
import { partNoun, pluralOf } from "~/components/check/part-noun";
import { readKitCount, readQuestion } from "~/components/check/read-question";

const asked = { kit: "S2", quantity: 10, by: null, options: [], ifs: [] };

describe("the question in the address", () => {
  test("comes back from the address as it went in", () => {
    const question = {
      kit: "S 4/7&",
      quantity: 250,
      by: "2027-03-14",
      options: ["A+B", "C"],
      ifs: ["stock:HB-2041:+2", "hold:A%3AB:"],
    };
    expect(readQuestion(new URLSearchParams(checkSearch(question)), asked)).toEqual(question);
  });

  test("is what the server answered where the address is silent or wrong", () => {
    expect(readQuestion(new URLSearchParams(), asked)).toBe(asked);
    expect(readQuestion(new URLSearchParams("quantity=ten"), asked)).toEqual(asked);
    expect(readQuestion(new URLSearchParams("kit=S2&quantity=10&by=01/15/2027"), asked)).toEqual(asked);
    expect(readQuestion(new URLSearchParams("kit=S2&quantity=10&by=2026-02-30"), asked)).toEqual(asked);
  });

  test.each([
    ["1", 1],
    [" 12 ", 12],
    ["1000", 1000],
    ["0", null],
    ["1001", null],
    ["-3", null],
    ["2.5", null],
    ["1e3", null],
    ["", null],
  ])("%j kits", (text, count) => {
    expect(readKitCount(text)).toBe(count);
  });
});

test.each([
  ["Bearing, fan hub, sealed", "bearing"],
  ["GRP panel, left", "GRP panel"],
  ["M6 bolt", "M6 bolt"],
  ["Haldane Wire cable", "Haldane Wire cable"],
  ["", ""],
])("%j is called %j in a sentence", (description, noun) => {
  expect(partNoun(description)).toBe(noun);
});

test.each([
  ["bearing", "bearings"],
  ["assembly", "assemblies"],
  ["box", "boxes"],
  ["tray", "trays"],
  ["harness", "harnesses"],
])("%j are %j", (noun, plural) => {
  expect(pluralOf(noun)).toBe(plural);
});
