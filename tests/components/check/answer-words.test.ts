import { describe, expect, test } from "vitest";
import { answerWords } from "~/components/check/answer-words";
import { buildCheckAnswer, buildCheckPart } from "../../support/build-check-answer";

function said(options: Parameters<typeof buildCheckAnswer>[0] = {}): string {
  return answerWords(buildCheckAnswer(options))
    .map((word) => word.text)
    .join("");
}

const scarce = (...stopsAt: number[]) =>
  stopsAt.map((kit, place) => ({ partNumber: `P-${place + 1}`, stopsAt: kit, perKit: 1 }));

describe("the answer in words", () => {
  test("names what can go, what the next waits for, the day and the money", () => {
    expect(said()).toBe(
      "Seven can be made from what is here, today. The eighth waits for two HB-2041 bearings until 20 January. All ten by 14 March, for 1,731.85 more in parts.",
    );
  });

  test("with a date, says first how many make it", () => {
    const page = { ...buildCheckAnswer({ due: "2027-02-01" }), readyByDate: 8 };
    const words = answerWords(page).map((word) => word.text);
    expect(words[0]).toBe("Eight of ten can be ready by 1 February. ");
    expect(answerWords({ ...page, readyByDate: 0 })[0].text).toMatch(/^None of ten can be ready/);
  });

  test("says nothing of money to those who may not see costs", () => {
    expect(said({ seesCosts: false })).toMatch(/All ten by 14 March\.$/);
  });

  test("counts the other parts that stop the same kit", () => {
    expect(said({ scarce: scarce(8, 8) })).toContain("waits for one P-1 bearing and one other part until");
    expect(said({ scarce: scarce(8, 8, 8, 9) })).toContain("and two other parts until");
  });

  test.each([
    [{ quantity: 5 }, "All five can be made from what is here, today."],
    [{ quantity: 2 }, "Both can be made from what is here, today."],
    [{ quantity: 1 }, "It can be made from what is here, today."],
    [
      { buildable: null, scarce: [] },
      "Nothing limits this kit. All ten can be made from what is here, by 14 March.",
    ],
    [{ quantity: 13, scarce: scarce(14) }, "All 13 can be made from what is here, by 14 March."],
  ])("knows when all can go: %j", (options, sentence) => {
    expect(said(options)).toBe(sentence);
  });

  test("knows none and one", () => {
    expect(said({ scarce: scarce(1), readyOn: { 1: "2027-01-20" } })).toMatch(
      /^None can be made from what is here\. The first waits for one P-1 bearing until 20 January\. All ten by 20 January/,
    );
    expect(said({ quantity: 1, scarce: scarce(1), readyOn: { 1: "2027-01-20" } })).toBe(
      "It cannot be made from what is here. It waits for one P-1 bearing until 20 January, for 1,731.85 more in parts.",
    );
    expect(said({ scarce: scarce(2) })).toMatch(
      /^One can be made from what is here, today\. The second waits/,
    );
  });

  test("does not say the same date twice when only the last kit waits", () => {
    expect(said({ quantity: 8 })).toBe(
      "Seven can be made from what is here, today. The eighth waits for two HB-2041 bearings until 20 January, for 1,731.85 more in parts.",
    );
  });

  test("says when nothing is left to buy", () => {
    expect(said({ cost: "0.00" })).toMatch(/All ten by 14 March, with no more parts to buy\.$/);
  });

  test("measures against the date asked for", () => {
    expect(said({ due: "2027-03-20" })).toContain("All ten by 14 March, in time for 20 March,");
    expect(said({ due: "2027-03-14" })).toContain("in time for 14 March");
    expect(said({ due: "2027-03-13" })).toContain("one day late for 13 March");
    expect(said({ due: "2027-02-28" })).toContain("14 days late for 28 February");
  });

  test("says weights with their unit and the part's decimals", () => {
    const page = buildCheckAnswer();
    page.parts = [
      buildCheckPart({ partNumber: "HB-2041", description: "Resin, clear", unit: "KGM", decimals: 3 }),
    ];
    const words = answerWords(page).map((word) => word.text);
    expect(words.join("")).toContain("waits for 2.000 kg of HB-2041 resin until");
  });

  test("takes the worst part in the server's order", () => {
    const page = buildCheckAnswer({ scarce: scarce(8, 8) });
    page.stoppers = ["P-2", "P-1"];
    expect(answerWords(page).find((word) => word.figure)?.text).toBe("P-2");
  });

  test("is silent without an answer", () => {
    expect(answerWords({ ...buildCheckAnswer(), answer: null })).toEqual([]);
  });
});
