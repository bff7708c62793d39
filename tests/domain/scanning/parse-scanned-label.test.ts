import { describe, expect, it } from "vitest";
import { parseScannedLabel } from "~/domain/scanning/parse-scanned-label";

describe("one field", () => {
  it.each([
    ["PHB-2041", { part: "HB-2041" }],
    ["P HB-2041", { part: "HB-2041" }],
    ["1T26-0119", { lot: "26-0119" }],
    ["S029", { serial: "029" }],
    ["LB06-4", { bin: "B06-4" }],
    ["1LB06-4", { bin: "B06-4" }],
    ["KPO-26-0901", { order: "PO-26-0901" }],
    ["Q12.5", { quantity: "12.5" }],
  ])("reads %s", (text, label) => {
    expect(parseScannedLabel(text)).toEqual(label);
  });

  it.each(["", "P", "P ", "HB-2041", "phb-2041", "9D2026"])("reads nothing from '%s'", (text) => {
    expect(parseScannedLabel(text)).toBeNull();
  });
});

describe("a message of many fields", () => {
  it("reads them between their separators", () => {
    expect(parseScannedLabel("[)>\u001e06\u001dPHB-2041\u001d1T26-0119\u001dQ20\u001e\u0004")).toEqual({
      part: "HB-2041",
      lot: "26-0119",
      quantity: "20",
    });
  });

  it("leaves out what it does not know, takes the first of two, and bears a lost closing", () => {
    expect(parseScannedLabel("[)>\u001e06\u001d9D20261201\u001dPA-1\u001dPA-2\u001dS7")).toEqual({
      part: "A-1",
      serial: "7",
    });
  });

  it("reads no other format", () => {
    expect(parseScannedLabel("[)>\u001e05\u001d0112345678901231\u001e\u0004")).toBeNull();
  });
});
