import { expect, test } from "vitest";
import { demoRows, demoText } from "../support/demo-files";

const movements = demoRows("movements.csv");
const decimals = new Map(demoRows("parts.csv").map((row) => [row.part_number, Number(row.decimals)]));

function stepsOf(row: Record<string, string>): number {
  return Math.round(Number(row.quantity) * 10 ** (decimals.get(row.part_number) ?? 0));
}

test("replayed from nothing, the history ends in exactly the balances of stock.csv and is never below zero", () => {
  const balances = new Map<string, number>();
  const below: string[] = [];
  const post = (key: string, steps: number, happenedAt: string) => {
    const balance = (balances.get(key) ?? 0) + steps;
    if (balance < 0) below.push(`${key} at ${happenedAt}`);
    if (balance === 0) balances.delete(key);
    else balances.set(key, balance);
  };
  for (const row of movements) {
    const place = (bin: string, state: string) => `${row.part_number}|${row.lot}|${bin}|${state}`;
    if (row.from_bin) post(place(row.from_bin, row.from_state), -stepsOf(row), row.happened_at);
    if (row.to_bin) post(place(row.to_bin, row.to_state), stepsOf(row), row.happened_at);
  }
  expect(below).toEqual([]);
  const stock = new Map(
    demoRows("stock.csv").map((row) => [
      `${row.part_number}|${row.lot}|${row.bin}|${row.state}`,
      stepsOf(row),
    ]),
  );
  const sorted = (map: Map<string, number>) => [...map].sort();
  expect(sorted(balances)).toEqual(sorted(stock));
});

test("each kind has the ends it needs, in order of time, over a hundred weeks", () => {
  const ends: Record<string, string> = {
    receive: "to",
    return: "to",
    issue: "from",
    scrap: "from",
    move: "both",
    hold: "both",
    release: "both",
  };
  const wrong = movements.filter((row) => {
    const has = row.from_bin ? (row.to_bin ? "both" : "from") : "to";
    if (row.kind === "adjust") return has === "both" || row.reason === "";
    return ends[row.kind] !== has;
  });
  expect(wrong).toEqual([]);
  expect(new Set(movements.map(({ kind }) => kind)).size).toBe(8);
  const times = movements.map(({ happened_at }) => happened_at);
  expect(times).toEqual([...times].sort());
  expect(times[0] < "2025-01-06").toBe(true);
  expect(times[times.length - 1] < "2026-12-01").toBe(true);
});

test("the history stays small enough to seed from", () => {
  expect(movements.length).toBeLessThan(25_000);
  expect(demoText("movements.csv").length).toBeLessThan(3_000_000);
});
