import { expect, test } from "vitest";
import { differenceWords } from "~/components/check/difference-words";
import { ifWords } from "~/components/check/if-words";
import { buildCheckAnswer } from "../../support/build-check-answer";

test("the difference is said in one sentence", () => {
  const { answer } = buildCheckAnswer();
  const without = { buildable: 5, earliest: "2027-04-01", cost: "2000.00" };
  expect(differenceWords({ answer, without })).toBe(
    "With these changes: 7 from what is here instead of 5, all 10 by 14 March instead of 1 April, 1,731.85 more in parts instead of 2,000.00.",
  );
  expect(differenceWords({ answer, without: { buildable: 7, earliest: "2027-03-14", cost: null } })).toBe(
    "With these changes the answer is the same.",
  );
  expect(differenceWords({ answer, without: null })).toBeNull();
});

test.each([
  ["stock:HB-2041:+2", "2 more of HB-2041 in stock"],
  ["stock:HB-2041:-1200", "1,200 fewer of HB-2041 in stock"],
  ["hold:AD-310:", "all AD-310 held"],
  ["hold:AD-310:26-0207", "lot 26-0207 of AD-310 held"],
  ["order:PO-1:2026-12-20", "PO-1 comes on 20 December"],
  ["arrival:EN-6400:1:2027-01-15", "1 of EN-6400 come on 15 January"],
  ["lead:CL-1114:1", "CL-1114 takes 1 day"],
  ["cost:CL-1114:4.20", "CL-1114 costs 4.20"],
  ["nonsense", "nonsense"],
])("%s is said as %s", (text, words) => {
  expect(ifWords(text, "2026-12-01")).toBe(words);
});
