import { describe, expect, test } from "vitest";
import { checkQuestionSchema } from "~/schemas/planning/check-answer";

describe("the question in an address", () => {
  test("fills its gaps", () => {
    expect(checkQuestionSchema.parse({})).toEqual({ quantity: 10, options: [], ifs: [] });
    expect(checkQuestionSchema.parse({ kit: "", quantity: "", by: "", options: "" })).toMatchObject({
      quantity: 10,
    });
  });

  test("reads a date and options", () => {
    expect(
      checkQuestionSchema.parse({ kit: "S2", quantity: "3", by: "2027-03-14", options: "A, B,," }),
    ).toEqual({
      kit: "S2",
      quantity: 3,
      by: "2027-03-14",
      options: ["A", "B"],
      ifs: [],
    });
  });

  test.each([
    { quantity: "0" },
    { quantity: "1001" },
    { quantity: "2.5" },
    { quantity: "ten" },
    { by: "14 March" },
    { by: "2027-02-30" },
  ])("refuses %j with a sentence", (wrong) => {
    const parsed = checkQuestionSchema.safeParse(wrong);
    expect(parsed.success).toBe(false);
    expect(parsed.error?.issues[0].message).toMatch(/^(Give|Ask)/);
  });
});
