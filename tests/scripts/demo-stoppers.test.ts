import { describe, expect, test } from "vitest";
import { checkShip } from "~/domain/planning/check-ship";
import { stoppers } from "../../scripts/demo/stoppers";
import { demoPlanInput, demoRows, depthsBelow } from "../support/demo-files";

const today = "2026-12-01";
const { structure, stock, supply } = demoPlanInput();
const demand = [{ partNumber: "S2", quantity: "10", due: null, options: [], serial: null }];
const result = checkShip({ structure, stock, supply, demand, sharing: "strict", today });
if (!result.ok) throw new Error(JSON.stringify(result.problems));
const { answer } = result;

const stockRows = demoRows("stock.csv");
const supplyRows = demoRows("supply.csv");
const usedBy = (kit: string) => new Set(depthsBelow(kit).keys());

describe("ten S2 of the demo firm", () => {
  test("seven can ship, all ten by the middle of March", () => {
    expect(answer.buildable).toEqual({ S2: 7 });
    expect(answer.earliest.S2 >= "2027-03-10" && answer.earliest.S2 <= "2027-03-20").toBe(true);
    const ready = answer.ladder.map(({ readyOn }) => readyOn);
    expect(ready[9] > ready[8] && ready[8] > ready[7] && ready[7] > ready[6]).toBe(true);
  });

  test("exactly the parts named stop the rest, each at its kit", () => {
    const stops = answer.shortages.map(({ partNumber, stopsAt }) => `${partNumber} stops kit ${stopsAt}`);
    expect(stops).toEqual(
      stoppers.map(({ partNumber, stopsAt }) => `${partNumber} stops kit ${stopsAt}`).sort(),
    );
    expect(stoppers.length).toBeGreaterThanOrEqual(12);
  });

  test("they stand at three depths or more", () => {
    const depths = depthsBelow("S2");
    for (const { partNumber, depth } of stoppers) expect(depths.get(partNumber), partNumber).toBe(depth);
    expect(new Set(stoppers.map(({ depth }) => depth)).size).toBeGreaterThanOrEqual(3);
  });

  test("the warnings are the two overdue orders and the grease that is out", () => {
    expect(answer.warnings).toEqual([
      { code: "overdue-supply", partNumber: "BT-3310" },
      { code: "overdue-supply", partNumber: "CB-0013" },
      { code: "as-required-none-on-hand", partNumber: "GR-01" },
    ]);
  });
});

describe("why each part stops kits", () => {
  const named = (reason: string) =>
    stoppers.filter((stopper) => stopper.reason === reason).map(({ partNumber }) => partNumber);
  const missing = (partNumber: string) =>
    Number(answer.shortages.find((row) => row.partNumber === partNumber)?.missing);
  const sum = (rows: Record<string, string>[]) =>
    rows.reduce((total, row) => total + Number(row.quantity), 0);

  test("held lots would have been enough", () => {
    const parts = named("held-lot");
    expect(parts.length).toBeGreaterThan(0);
    for (const part of parts) {
      expect(
        sum(stockRows.filter((row) => row.part_number === part && row.state === "held")),
      ).toBeGreaterThanOrEqual(missing(part));
    }
  });

  test("expired lots would have been enough", () => {
    const parts = named("expired-lot");
    expect(parts.length).toBeGreaterThan(0);
    for (const part of parts) {
      const gone = stockRows.filter(
        (row) => row.part_number === part && row.expires_on !== "" && row.expires_on < today,
      );
      expect(sum(gone)).toBeGreaterThanOrEqual(missing(part));
    }
  });

  test("overdue orders would have been enough", () => {
    const parts = named("overdue-order");
    expect(parts.length).toBeGreaterThan(0);
    for (const part of parts) {
      const late = supplyRows.filter((row) => row.part_number === part && row.due < today);
      expect(sum(late)).toBeGreaterThanOrEqual(missing(part));
    }
  });

  test("parts shared with S4 were taken by four-seat builds this autumn", () => {
    const parts = named("drawn-down-by-s4");
    expect(parts.length).toBeGreaterThan(0);
    const taken = demoRows("movements.csv").filter(
      ({ kind, happened_at }) => kind === "issue" && happened_at >= "2026-10-15",
    );
    for (const part of parts) {
      expect(usedBy("S4")).toContain(part);
      expect(sum(taken.filter((row) => row.part_number === part))).toBeGreaterThanOrEqual(missing(part));
    }
  });

  test("more clutches built ahead would have left enough of their parts", () => {
    const clutch = answer.builds.find(({ partNumber }) => partNumber === "CL-100");
    expect(clutch).toMatchObject({ gross: "10", fromStock: "3", build: "7" });
    const below = new Set(depthsBelow("CL-100").keys());
    expect(named("not-built-ahead").length).toBeGreaterThan(0);
    for (const part of named("not-built-ahead")) expect(below).toContain(part);
  });

  test("twelve left brackets and seven right ones make seven pairs", () => {
    expect(named("one-hand-short")).toEqual(["RU-2210R"]);
    expect(sum(stockRows.filter((row) => row.part_number === "RU-2210L"))).toBe(12);
    expect(sum(stockRows.filter((row) => row.part_number === "RU-2210R"))).toBe(7);
  });

  test("plain shortages have nothing held, expired or late", () => {
    expect(named("plain-shortage").length).toBeGreaterThan(0);
    for (const part of named("plain-shortage")) {
      const rows = stockRows.filter((row) => row.part_number === part);
      expect(
        rows.every((row) => row.state === "usable" && (row.expires_on === "" || row.expires_on >= today)),
      ).toBe(true);
      expect(supplyRows.filter((row) => row.part_number === part)).toEqual([]);
    }
  });
});
