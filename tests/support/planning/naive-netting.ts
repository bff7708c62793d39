import type { IsoDate, PlanLine, PlanPart } from "~/domain/planning/types";
import type { Shop } from "./factories";
import {
  ceiling,
  dividedBy,
  oneMinus,
  rational,
  smaller,
  tenTo,
  times,
  toSteps,
  wholeNumber,
} from "./rational";

/** Kits alike, taken together, in the order of service. `serial` is that of the first. */
export interface Kits {
  demand: number;
  partNumber: string;
  count: bigint;
  due: IsoDate | null;
  options: readonly string[];
  serial: bigint | null;
}

/** `coming` counts every open order, `coming-by-date` those that are there by the demand's date. */
export type Pass = "now" | "coming" | "coming-by-date";

/** What one part gives and gets, in steps, an entry a block of kits: what the block adds to those before. */
export interface Figures {
  gross: bigint[];
  fromStock: bigint[];
  onOrder: bigint[];
  net: bigint[];
  start: bigint[];
  lastDue: (IsoDate | null)[];
}

export interface Netting {
  part(partNumber: string): PlanPart;
  figures(partNumber: string): Figures;
  /** Whether what is started of the parent for any of these blocks takes the component by this line. */
  takes(line: PlanLine, blocks: number[]): boolean;
}

export function addDays(date: IsoDate, days: number): IsoDate {
  return new Date(Date.parse(`${date}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10);
}

/** PLANNING.md, section 5: overdue, or without a date, it counts from today + lead time. */
export function expectedOn(due: IsoDate | null, part: PlanPart, today: IsoDate): IsoDate {
  return due === null || due < today ? addDays(today, part.leadTimeDays) : due;
}

/** Whether a line counts for a block of kits: option, serial and date. */
export function countsFor(line: PlanLine, kits: Kits, today: IsoDate): boolean {
  const date = kits.due ?? today;
  if (line.option !== null && !kits.options.includes(line.option)) return false;
  if (line.fromDate !== null && date < line.fromDate) return false;
  if (line.toDate !== null && date > line.toDate) return false;
  if (kits.serial === null) return line.toSerial === null;
  if (line.fromSerial !== null && kits.serial < BigInt(line.fromSerial)) return false;
  return line.toSerial === null || kits.serial <= BigInt(line.toSerial);
}

function differences(totals: bigint[]): bigint[] {
  return totals.map((total, at) => total - (at === 0 ? 0n : totals[at - 1]));
}

function runningTotals(values: bigint[]): bigint[] {
  let total = 0n;
  return values.map((value) => {
    total += value;
    return total;
  });
}

/** One place that a part can be taken from: a lot, or an open order. */
interface Source {
  left: bigint;
  order: string;
  due: IsoDate | null;
  serves(kits: Kits): boolean;
}

function take(sources: Source[], kits: Kits, wanted: bigint): { taken: bigint; lastDue: IsoDate | null } {
  let taken = 0n;
  let lastDue: IsoDate | null = null;
  for (const source of sources) {
    if (!source.serves(kits)) continue;
    const amount = smaller(source.left, wanted - taken);
    if (amount === 0n) continue;
    source.left -= amount;
    taken += amount;
    lastDue = source.due;
  }
  return { taken, lastDue };
}

function lotsOf(shop: Shop, part: PlanPart, pass: Pass): Source[] {
  return shop.stock
    .filter((row) => row.partNumber === part.partNumber && (pass === "now" || row.nowOnly !== true))
    .map((row) => ({
      left: toSteps(row.quantity, part.decimals),
      order: row.expiresOn ?? "9999-99-99",
      due: null,
      serves: (kits: Kits) => row.expiresOn === null || row.expiresOn >= (kits.due ?? shop.today),
    }))
    .sort((a, b) => (a.order < b.order ? -1 : 1));
}

function ordersOf(shop: Shop, part: PlanPart, pass: Pass): Source[] {
  if (pass === "now") return [];
  return shop.supply
    .filter((row) => row.partNumber === part.partNumber)
    .map((row) => {
      const due = expectedOn(row.due, part, shop.today);
      const serves = (kits: Kits) => pass === "coming" || kits.due === null || due <= kits.due;
      return { left: toSteps(row.quantity, part.decimals), order: due, due, serves };
    })
    .sort((a, b) => (a.order < b.order ? -1 : 1));
}

/**
 * Netting as section 3 of PLANNING.md says it, asked from the component up: obviously right, not fast.
 * Blocks are served in the order given, so a block's figures are what it adds to those before it.
 */
export function naiveNetting(shop: Shop, blocks: Kits[], pass: Pass): Netting {
  const parts = new Map(shop.parts.map((part) => [part.partNumber, part]));
  const linesInto = new Map<string, PlanLine[]>();
  const withLines = new Set(shop.lines.map((line) => line.parent));
  for (const line of shop.lines) {
    linesInto.set(line.component, [...(linesInto.get(line.component) ?? []), line]);
  }
  const known = new Map<string, Figures>();

  function part(partNumber: string): PlanPart {
    const found = parts.get(partNumber);
    if (!found) throw new Error(`no part ${partNumber}`);
    return found;
  }

  function lineNeed(line: PlanLine): bigint[] {
    if (line.quantity === null) return blocks.map(() => 0n);
    const each = dividedBy(rational(line.quantity), oneMinus(rational(line.scrap)));
    const started = figures(line.parent).start;
    const counted = blocks.map((kits, at) => (countsFor(line, kits, shop.today) ? started[at] : 0n));
    const needs = runningTotals(counted).map((steps) => {
      const parents = dividedBy(wholeNumber(steps), tenTo(part(line.parent).decimals));
      return ceiling(times(times(parents, each), tenTo(part(line.component).decimals)));
    });
    return differences(needs);
  }

  function grossOf(self: PlanPart): bigint[] {
    const needs = (linesInto.get(self.partNumber) ?? []).map(lineNeed);
    return blocks.map((kits, at) => {
      const own = kits.partNumber === self.partNumber ? kits.count * 10n ** BigInt(self.decimals) : 0n;
      return needs.reduce((total, need) => total + need[at], own);
    });
  }

  function startOf(self: PlanPart, net: bigint[]): bigint[] {
    if (self.sourcing === "buy" || !withLines.has(self.partNumber)) return net.map(() => 0n);
    if (self.sourcing === "phantom") return net;
    const good = rational(self.yield);
    return differences(runningTotals(net).map((total) => ceiling(dividedBy(wholeNumber(total), good))));
  }

  function figures(partNumber: string): Figures {
    const before = known.get(partNumber);
    if (before) return before;
    const self = part(partNumber);
    const gross = grossOf(self);
    const lots = lotsOf(shop, self, pass);
    const orders = ordersOf(shop, self, pass);
    const drawn = blocks.map((kits, at) => {
      const stock = take(lots, kits, gross[at]);
      const order = take(orders, kits, gross[at] - stock.taken);
      return { stock: stock.taken, order: order.taken, lastDue: order.lastDue };
    });
    const net = gross.map((amount, at) => amount - drawn[at].stock - drawn[at].order);
    const result: Figures = {
      gross,
      fromStock: drawn.map((entry) => entry.stock),
      onOrder: drawn.map((entry) => entry.order),
      net,
      start: startOf(self, net),
      lastDue: drawn.map((entry) => entry.lastDue),
    };
    known.set(partNumber, result);
    return result;
  }

  function takes(line: PlanLine, among: number[]): boolean {
    const { start } = figures(line.parent);
    const some = line.quantity !== null && rational(line.quantity).over > 0n;
    return some && among.some((at) => start[at] > 0n && countsFor(line, blocks[at], shop.today));
  }

  return { part, figures, takes };
}
