import { expect, test } from "vitest";
import { shiftDates } from "../../scripts/seed/shift-dates";

const file =
  'part_number,due,reference,note\n2026-12-01,2026-12-01,2026-12-01,"a, b"\nA,,,\nB,2027-02-27,,\n';
const shift = (text: string, today: string) =>
  new TextDecoder().decode(shiftDates(new TextEncoder().encode(text), today));

test("leaves the files alone on the day they were written for", () => {
  expect(shift(file, "2026-12-01")).toBe(file);
});

test("moves dates in date columns, and nothing else", () => {
  expect(shift(file, "2026-12-03")).toBe(
    'part_number,due,reference,note\n2026-12-01,2026-12-03,2026-12-01,"a, b"\nA,,,\nB,2027-03-01,,',
  );
});

test("moves moments by whole days", () => {
  expect(shift("happened_at\n2026-11-27T11:12:00Z", "2027-12-01")).toBe("happened_at\n2027-11-27T11:12:00Z");
});
