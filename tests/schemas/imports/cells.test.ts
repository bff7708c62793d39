import { describe, expect, test } from "vitest";
import type { ImportKind } from "~/schemas/imports/import-kind";
import { kitOrdersKind } from "~/schemas/imports/kit-orders";
import { partsKind } from "~/schemas/imports/parts";
import { stockKind } from "~/schemas/imports/stock";
import { structureKind } from "~/schemas/imports/structure";
import { suppliersKind } from "~/schemas/imports/suppliers";

function read<Row>({ columns, row }: ImportKind<Row>, cells: Record<string, string>) {
  const empty = Object.fromEntries([...columns.required, ...columns.optional].map((name) => [name, ""]));
  return row.safeParse({ ...empty, ...cells });
}

function refused<Row>(kind: ImportKind<Row>, cells: Record<string, string>): string[] {
  const parsed = read(kind, cells);
  return parsed.success ? [] : parsed.error.issues.map((issue) => String(issue.path[0]));
}

test("empty cells take the defaults", () => {
  expect(read(partsKind, { part_number: "A", sourcing: "buy" }).data).toEqual({
    partNumber: "A",
    description: "",
    sourcing: "buy",
    unit: "EA",
    decimals: 0,
    leadTimeDays: 0,
    safetyStock: "0",
    lotRule: "lot-for-lot",
    lotMinimum: null,
    lotMultiple: null,
    lotMaximum: null,
    lotDays: null,
    yield: "1",
    unitCost: null,
    massKg: null,
    sold: false,
  });
  expect(read(structureKind, { parent: "A", component: "B" }).data).toMatchObject({
    quantity: null,
    scrap: "0",
  });
  expect(read(stockKind, { part_number: "A", quantity: "1" }).data).toMatchObject({
    state: "usable",
    bin: "",
    lot: "",
  });
});

test.each([
  "A",
  "007",
  "1E05",
  "3-12",
  "__proto__",
  "constructor",
  "A=B@C:D#E",
  "M6 × 20",
  "x".repeat(64),
  "日本",
])("%s is a part number", (text) => {
  expect(read(stockKind, { part_number: ` ${text}\u00a0`, quantity: "1" }).data?.partNumber).toBe(text);
});

test("part numbers are kept in one Unicode form", () => {
  expect(read(stockKind, { part_number: "A\u030a", quantity: "1" }).data?.partNumber).toBe("\u00c5");
});

test.each(["", "  ", "x".repeat(65), "A\tB", "A\nB", "A\u200bB", "A\u202eB", "A\u0000", "\ud800"])(
  "%j is no part number",
  (text) => {
    expect(refused(stockKind, { part_number: text, quantity: "1" })).toEqual(["part_number"]);
  },
);

describe("quantities", () => {
  test.each([
    ["12", "12"],
    ["0.350", "0.35"],
    [" 7 ", "7"],
    ["007.50", "7.5"],
    ["0", "0"],
    ["0.000000", "0"],
    ["123456789012345678901", "123456789012345678901"],
  ])("%s is read as %s", (text, value) => {
    expect(read(stockKind, { part_number: "A", quantity: text }).data?.quantity).toBe(value);
  });

  test.each([
    "",
    "-1",
    "+5",
    "1e3",
    "1E3",
    "1.00E+05",
    "NaN",
    "Infinity",
    "∞",
    "ten",
    "1,000",
    "1.000,5",
    "1 000",
    "1'000",
    "0x1F",
    "1_000",
    "½",
    "٣",
    "5.",
    ".",
    "1.2.3",
    "0.1234567",
    "9".repeat(31),
  ])("%j is refused", (text) => {
    expect(refused(stockKind, { part_number: "A", quantity: text })).toEqual(["quantity"]);
  });
});

test.each(["0", "0.5", "0.99999999", "0.0"])("scrap %s", (scrap) => {
  expect(refused(structureKind, { parent: "A", component: "B", scrap })).toEqual([]);
});

test.each(["1", "1.0", "-0.1", "2%", "1e-2", "0,5", "x"])("no scrap: %s", (scrap) => {
  expect(refused(structureKind, { parent: "A", component: "B", scrap })).toEqual(["scrap"]);
});

test.each(["1", "1.000", "0.85", "0.0001"])("yield %s", (fraction) => {
  expect(refused(partsKind, { part_number: "A", sourcing: "make", yield: fraction })).toEqual([]);
});

test.each(["0", "0.000", "1.0001", "2", "-1", "85%"])("no yield: %s", (fraction) => {
  expect(refused(partsKind, { part_number: "A", sourcing: "make", yield: fraction })).toEqual(["yield"]);
});

test.each(["2028-02-29", "2000-02-29", "2026-12-31"])("%s is a day", (day) => {
  expect(refused(stockKind, { part_number: "A", quantity: "1", expires_on: day })).toEqual([]);
});

test.each([
  "2026-02-29",
  "1900-02-29",
  "2026-04-31",
  "2026-00-10",
  "2026-12-00",
  "0000-01-01",
  "26-12-01",
  "2026/12/01",
])("%s is no day", (day) => {
  expect(refused(stockKind, { part_number: "A", quantity: "1", expires_on: day })).toEqual(["expires_on"]);
});

test.each<[string, string]>([
  ["sourcing", "BUY"],
  ["unit", "each"],
  ["unit", "ea"],
  ["decimals", "7"],
  ["decimals", "1.5"],
  ["decimals", "-1"],
  ["lead_time_days", "two"],
  ["lot_rule", "eoq"],
  ["lot_maximum", "0"],
  ["sold", "yes"],
  ["unit_cost", "-1"],
])("a part with %s %s is refused", (column, text) => {
  expect(refused(partsKind, { part_number: "A", sourcing: "buy", [column]: text })).toEqual([column]);
});

test("every bad cell of a row is told", () => {
  expect(refused(partsKind, { part_number: "", sourcing: "x", yield: "2" })).toEqual([
    "part_number",
    "sourcing",
    "yield",
  ]);
});

test("options are joined by a plus, each once", () => {
  const order = { number: "KO-1", kit: "S2" };
  expect(read(kitOrdersKind, { ...order, options: "NIGHT + HEATER+NIGHT" }).data?.options).toEqual([
    "NIGHT",
    "HEATER",
  ]);
  expect(refused(kitOrdersKind, { ...order, options: "NIGHT++HEATER" })).toEqual(["options"]);
  expect(refused(kitOrdersKind, { ...order, number: "KO/1" })).toEqual(["number"]);
  expect(refused(kitOrdersKind, { ...order, serial: "blue" })).toEqual(["serial"]);
});

test("mail addresses and currencies", () => {
  expect(refused(suppliersKind, { supplier: "A", email: "nobody" })).toEqual(["email"]);
  expect(refused(suppliersKind, { supplier: "A", currency: "euro" })).toEqual(["currency"]);
  expect(read(suppliersKind, { supplier: "A" }).data).toMatchObject({
    name: "A",
    currency: "EUR",
    email: "",
  });
});

test.each([
  [{ from_serial: "050", to_serial: "020" }, ["to_serial"]],
  [{ from_serial: "098", to_serial: "100" }, []],
  [{ from_serial: "7", to_serial: "7" }, []],
  [{ from_date: "2027-01-02", to_date: "2027-01-01" }, ["to_date"]],
  [{ from_date: "2027-01-01", to_date: "2027-01-01" }, []],
])("effectivity %j", (cells, columns) => {
  expect(refused(structureKind, { parent: "A", component: "B", ...cells })).toEqual(columns);
});
