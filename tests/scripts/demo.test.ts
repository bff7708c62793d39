import { describe, expect, test } from "vitest";
import { rollUpCost } from "~/domain/planning/roll-up-cost";
import { rollUpMass } from "~/domain/planning/roll-up-mass";
import type { PlanLine } from "~/domain/planning/types";
import { binsKind } from "~/schemas/imports/bins";
import { kitOrdersKind } from "~/schemas/imports/kit-orders";
import { offersKind } from "~/schemas/imports/offers";
import { partsKind } from "~/schemas/imports/parts";
import { stockKind } from "~/schemas/imports/stock";
import { structureKind } from "~/schemas/imports/structure";
import { suppliersKind } from "~/schemas/imports/suppliers";
import { supplyKind } from "~/schemas/imports/supply";
import { readImportRows } from "~/services/imports/files/read-import-rows";
import { demoFiles } from "../../scripts/demo/demo-files";
import { demoPlanInput, demoRows, demoText, depthsBelow } from "../support/demo-files";

const column = (file: string, name: string) => new Set(demoRows(file).map((row) => row[name]));

describe("the generator", () => {
  test("writes the committed files again, byte for byte", () => {
    const files = demoFiles();
    expect([...files.keys()].sort()).toEqual([
      "bins.csv",
      "kit-orders.csv",
      "movements.csv",
      "offers.csv",
      "parts.csv",
      "stock.csv",
      "structure.csv",
      "suppliers.csv",
      "supply.csv",
    ]);
    for (const [name, text] of files) expect(text === demoText(name), name).toBe(true);
  });
});

describe("the files", () => {
  test.each([
    ["bins", binsKind],
    ["kit-orders", kitOrdersKind],
    ["offers", offersKind],
    ["parts", partsKind],
    ["stock", stockKind],
    ["structure", structureKind],
    ["suppliers", suppliersKind],
    ["supply", supplyKind],
  ])("%s.csv has no row that an import would refuse", (name, kind) => {
    const read = readImportRows<unknown>(Buffer.from(demoText(`${name}.csv`)), kind);
    expect(read.ok && read.refused).toEqual([]);
  });

  test("agree with each other", () => {
    demoPlanInput();
    const parts = column("parts.csv", "part_number");
    const bins = column("bins.csv", "bin");
    const suppliers = column("suppliers.csv", "supplier");
    const options = column("structure.csv", "option");
    for (const file of ["stock.csv", "supply.csv", "offers.csv", "movements.csv"]) {
      const unknown = [...column(file, "part_number")].filter((partNumber) => !parts.has(partNumber));
      expect(unknown, file).toEqual([]);
    }
    expect([...column("stock.csv", "bin")].filter((bin) => !bins.has(bin))).toEqual([]);
    expect([...column("offers.csv", "supplier")].filter((supplier) => !suppliers.has(supplier))).toEqual([]);
    for (const order of demoRows("kit-orders.csv")) {
      expect(["S2", "S4"]).toContain(order.kit);
      for (const option of order.options.split("+")) expect(options).toContain(option);
    }
    const offered = new Set(
      demoRows("offers.csv").map((row) => `${row.supplier}/${row.part_number}/${row.from_quantity}`),
    );
    expect(offered.size).toBe(demoRows("offers.csv").length);
  });

  test("offers name one preferred supplier for each bought part, and each purchase order goes to one", () => {
    const preferred = new Map<string, string>();
    for (const row of demoRows("offers.csv").filter((offer) => offer.preferred === "1")) {
      expect(preferred.get(row.part_number) ?? row.supplier).toBe(row.supplier);
      preferred.set(row.part_number, row.supplier);
    }
    const bought = demoRows("parts.csv").filter((row) => row.sourcing === "buy");
    expect(bought.filter((row) => !preferred.has(row.part_number))).toEqual([]);
    const supplierOf = new Map<string, string | undefined>();
    for (const { reference, part_number } of demoRows("supply.csv")) {
      const supplier = preferred.get(part_number);
      expect(reference.startsWith("PO-"), part_number).toBe(supplier !== undefined);
      if (supplier) expect(supplierOf.get(reference) ?? supplier).toBe(supplier);
      supplierOf.set(reference, supplier);
    }
    const past = column("movements.csv", "reference");
    for (const reference of supplierOf.keys()) expect(past).not.toContain(reference);
  });
});

describe("the kits", () => {
  const s2 = depthsBelow("S2");
  const s4 = depthsBelow("S4");
  const parts = demoRows("parts.csv");

  test("about eighteen hundred parts in an S2, on six to eight levels; S4 shares most of them", () => {
    expect(s2.size).toBeGreaterThanOrEqual(1750);
    expect(s2.size).toBeLessThanOrEqual(1850);
    const levels = 1 + Math.max(...s2.values());
    expect(levels).toBeGreaterThanOrEqual(6);
    expect(levels).toBeLessThanOrEqual(8);
    const own = [...s4.keys()].filter((part) => !s2.has(part)).length;
    expect(own).toBeGreaterThan(200);
    expect(own).toBeLessThan(320);
    expect(parts.filter(({ part_number }) => !s2.has(part_number) && !s4.has(part_number))).toEqual([]);
  });

  test("an S2 weighs and costs what such a craft would", () => {
    const { structure } = demoPlanInput();
    const counts = (line: PlanLine) =>
      line.option === null && line.toSerial === null && line.fromDate === null;
    const weigh = (part: string) => Number(rollUpMass(structure, part, counts)?.massKg);
    const withoutEngine = weigh("S2") - weigh("EN-6400");
    expect(withoutEngine).toBeGreaterThan(230);
    expect(withoutEngine).toBeLessThan(260);
    const cost = Number(rollUpCost(structure, "S2", [], "2026-12-01"));
    expect(cost).toBeGreaterThan(14_000);
    expect(cost).toBeLessThan(19_000);
  });

  test("every bought part has a cost, a lead time of 3 to 140 days and a name of its own", () => {
    const bought = parts.filter(({ sourcing }) => sourcing === "buy");
    const odd = bought.filter(({ unit_cost, lead_time_days }) => {
      const days = Number(lead_time_days);
      return !(Number(unit_cost) > 0) || days < 3 || days > 140;
    });
    expect(odd).toEqual([]);
    const names = parts.map(({ description }) => description);
    expect(new Set(names).size).toBe(names.length);
  });
});
