import { expect, test } from "vitest";
import { dayNumber, isoDate } from "~/domain/planning/dates/day-number";

test.each([
  ["1970-01-01", 0],
  ["1969-12-31", -1],
  ["2000-02-29", 11_016],
  ["2026-12-01", 20_788],
  ["9999-12-31", 2_932_896],
])("%s is day %i, and back", (date, day) => {
  expect(dayNumber(date)).toBe(day);
  expect(isoDate(day)).toBe(date);
});

test.each(["2026-02-29", "2026-13-01", "2026-00-10", "2026-1-1", "01.12.2026", "", "tomorrow"])(
  "%j is no date",
  (text) => {
    expect(() => dayNumber(text)).toThrow(`Not a date: ${text}`);
  },
);
