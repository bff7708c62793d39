import { expect, test } from "vitest";
import { stopperRows } from "~/components/check/stopper-rows";
import { buildCheckAnswer, buildCheckPart } from "../../support/build-check-answer";

test("stoppers keep the server's order and are written with their decimals, points in line", () => {
  const page = buildCheckAnswer({
    scarce: [
      { partNumber: "RS-40", stopsAt: 9, perKit: 3 },
      { partNumber: "HB-2041", stopsAt: 8, perKit: 2 },
    ],
  });
  page.parts = [
    buildCheckPart({ partNumber: "HB-2041" }),
    buildCheckPart({ partNumber: "RS-40", unit: "KGM", decimals: 2, cost: null, supplier: null }),
  ];
  const rows = stopperRows(page);
  expect(rows.map((row) => row.partNumber)).toEqual(["RS-40", "HB-2041"]);
  expect(rows.map((row) => row.missing)).toEqual(["6.00", "6\u00a0\u00a0\u00a0"]);
  expect(rows.map((row) => row.cost)).toEqual([null, "412.50"]);
  expect(rows[1]).toMatchObject({
    stopsAt: 8,
    hereOn: "10 Jan",
    supplier: "Northquay Bearings",
    isShort: true,
  });
});

test("a part without a supplier that is made here says so", () => {
  const page = buildCheckAnswer();
  page.parts = [buildCheckPart({ partNumber: "HB-2041", supplier: null, sourcing: "make" })];
  expect(stopperRows(page)[0].supplier).toBe("built here");
});

test("a part that nothing has to come of says what covers it, and orders after the date are told", () => {
  const page = buildCheckAnswer();
  const [shortage] = page.answer?.shortages ?? [];
  Object.assign(shortage, { short: "0", onOrder: "0" });
  expect(stopperRows(page)[0].note).toBe("builds under way will cover it");
  Object.assign(shortage, { short: "2" });
  expect(stopperRows(page)[0].note).toBeNull();
  page.parts = [buildCheckPart({ partNumber: "HB-2041", hasLaterOrders: true })];
  expect(stopperRows(page)[0].note).toBe("more is on order, after the date");
});
