import type { Book } from "./book";
import { packOf } from "./pack-of";
import { seededRandom } from "./random";
import { stoppers } from "./stoppers";
import { preferredSupplier, type Supplier } from "./trade-suppliers";

export interface Supply {
  partNumber: string;
  quantity: number;
  due: string;
  reference: string;
}

/** Orders that answer the stoppers; the rest of what is on order is chosen by chance. */
const BOUGHT: [string, number, string][] = [
  ["HB-2041", 20, "2027-01-18"],
  ["LD-2101", 6, "2027-01-25"],
  ["BT-3310", 6, "2026-11-13"],
  ["CB-0013", 50, "2026-11-24"],
  ["FA-2120", 60, "2027-01-22"],
  ["SK-0010", 150, "2027-01-11"],
  ["AD-310", 8, "2026-12-21"],
  ["CL-1121", 30, "2026-12-18"],
  ["GC-211", 40, "2026-11-19"],
  ["FA-2103", 36, "2027-01-08"],
  ["IP-1013", 6, "2026-12-14"],
];
const BUILDS: [string, number, string][] = [
  ["HU-1110", 2, "2026-12-09"],
  ["HU-1111", 2, "2026-12-11"],
  ["DK-1010", 2, "2026-12-04"],
  ["SK-110", 2, "2026-12-08"],
  ["SK-120", 2, "2026-12-15"],
  ["WH-110", 4, "2026-12-07"],
  ["BU-110", 4, "2026-12-03"],
  ["DU-100", 2, "2026-12-16"],
  ["PP-110", 3, "2026-12-10"],
  ["SE-110L", 3, "2026-12-18"],
  ["TF-110", 2, "2026-11-27"],
];

/** Above every number of the past year. */
const FIRST_PURCHASE = 901;
const FIRST_BUILD = 901;

/** Open purchase orders, one supplier each, and open builds. */
export function openOrders(book: Book, suppliers: readonly Supplier[]): Supply[] {
  const bySupplier = new Map<string, Omit<Supply, "reference">[]>();
  for (const line of [
    ...BOUGHT.map(([partNumber, quantity, due]) => ({ partNumber, quantity, due })),
    ...chanceOrders(book),
  ]) {
    const { code } = preferredSupplier(book.part(line.partNumber), suppliers);
    bySupplier.set(code, [...(bySupplier.get(code) ?? []), line]);
  }
  const orders = [...bySupplier].flatMap(([code, lines]) => splitOrders(code, lines));
  const numbered = orders
    .sort((a, b) => (a[0].due < b[0].due ? -1 : a[0].due > b[0].due ? 1 : 0))
    .flatMap((lines, index) =>
      lines.map((line) => ({
        ...line,
        reference: `PO-26-${String(FIRST_PURCHASE + index * 3 + (index % 2)).padStart(4, "0")}`,
      })),
    );
  const builds = BUILDS.map(([partNumber, quantity, due], index) => ({
    partNumber,
    quantity,
    due,
    reference: `SO-26-${String(FIRST_BUILD + index * 3).padStart(4, "0")}`,
  }));
  return [...numbered, ...builds];
}

function chanceOrders(book: Book): Omit<Supply, "reference">[] {
  const lines: Omit<Supply, "reference">[] = [];
  for (const part of book.parts.values()) {
    const chances = seededRandom(`${part.partNumber}/on-order`);
    const taken =
      stoppers.some(({ partNumber }) => partNumber === part.partNumber) ||
      BOUGHT.some(([partNumber]) => partNumber === part.partNumber);
    if (part.sourcing !== "buy" || taken || !chances.chance(0.055)) continue;
    const pack = packOf(part);
    const packs =
      pack.per > 1 || (part.cost ?? 0) > 60
        ? chances.whole(1, 3)
        : (part.cost ?? 0) > 4
          ? chances.pick([3, 4, 5, 6, 10])
          : chances.pick([10, 20, 25]);
    const late = chances.chance(0.12);
    lines.push({
      partNumber: part.partNumber,
      quantity: Number((packs * pack.per * pack.multiple).toFixed(part.decimals)),
      due: day(late ? -chances.whole(2, 24) : chances.whole(2, Math.min(80, part.leadTimeDays))),
    });
  }
  return lines;
}

function splitOrders(code: string, lines: Omit<Supply, "reference">[]): Omit<Supply, "reference">[][] {
  const sorted = [...lines].sort((a, b) => (a.due < b.due ? -1 : a.due > b.due ? 1 : 0));
  const most = seededRandom(`${code}/orders`).whole(2, 5);
  const orders: Omit<Supply, "reference">[][] = [];
  for (let from = 0; from < sorted.length; from += most) orders.push(sorted.slice(from, from + most));
  return orders;
}

function day(offset: number): string {
  const date = new Date(Date.UTC(2026, 11, 1 + offset));
  const closed = date >= new Date("2026-12-24") && date <= new Date("2027-01-03");
  if (closed) date.setTime(Date.UTC(2027, 0, 5));
  const weekday = date.getUTCDay();
  if (weekday === 0) date.setUTCDate(date.getUTCDate() + 1);
  if (weekday === 6) date.setUTCDate(date.getUTCDate() - 1);
  return date.toISOString().slice(0, 10);
}
