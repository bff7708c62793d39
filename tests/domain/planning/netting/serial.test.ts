import { expect, test } from "vitest";
import { parseSerial, serialWithin } from "~/domain/planning/netting/serial";

test.each([
  ["098", { prefix: "", number: 98, width: 3 }],
  ["SC-098", { prefix: "SC-", number: 98, width: 3 }],
  ["A1B22", { prefix: "A1B", number: 22, width: 2 }],
  ["999999999999999", { prefix: "", number: 999_999_999_999_999, width: 15 }],
  ["", null],
  ["SC-", null],
  ["98a", null],
  ["1234567890123456", null],
])("%j", (text, serial) => {
  expect(parseSerial(text)).toEqual(serial);
});

test.each([
  ["098", null, null, true],
  ["098", "098", null, true],
  ["097", "098", null, false],
  ["098", null, "098", true],
  ["099", null, "098", false],
  ["0100", "99", null, true],
  ["SC-100", "SC-099", "SC-101", true],
  ["SC-100", "SD-001", null, false],
  ["SC-100", null, "SB-999", false],
  ["SC-100", "A", "Z", true],
])("%s from %s to %s: %s", (text, from, to, isWithin) => {
  const serial = parseSerial(text);
  if (!serial) throw new Error("This is a serial.");
  expect(serialWithin(serial, from, to)).toBe(isWithin);
});
