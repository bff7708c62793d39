import { requireSteps } from "../quantity/parse-steps";
import type { Steps } from "../quantity/steps";
import { addSteps } from "../quantity/steps";
import { dayNumber } from "./dates/day-number";
import type { Bucket, Pool } from "./netting/pool";
import { partKey } from "./part-key";
import type { Structure } from "./structure/structure";
import type { IsoDate, PlanStock, PlanSupply } from "./types";

/** Stock and open orders laid out for planning on one day. Immutable. */
export interface Supplies {
  today: number;
  /** Usable stock as the pass *now* sees it, components of builds under way included. */
  stockNow: Pool;
  /** Usable stock as the pass *coming* sees it. */
  stockComing: Pool;
  orders: Pool;
  /** True where a quantity passes 2^53 steps. */
  wide: boolean;
}

/**
 * Sorts stock by expiry and open orders by the day they count from: an overdue or undated order counts
 * from today + the part's lead time (PLANNING.md, section 5). Rows of parts outside the structure are
 * left out; quantities must have been checked at the door.
 */
export function compileSupplies(
  structure: Structure,
  stock: readonly PlanStock[],
  orders: readonly PlanSupply[],
  today: IsoDate,
): Supplies {
  const day = dayNumber(today);
  const find = (text: string) => structure.numberOf.get(text) ?? structure.numberOf.get(partKey(text));
  const compiled = {
    today: day,
    stockNow: emptyPool(),
    stockComing: emptyPool(),
    orders: emptyPool(),
    wide: false,
  };
  for (const [at, row] of stock.entries()) {
    const part = find(row.partNumber);
    if (part === undefined) continue;
    const quantity = requireSteps(row.quantity, structure.decimals[part]);
    const until = row.expiresOn === null ? Number.POSITIVE_INFINITY : dayNumber(row.expiresOn);
    const bucket: Bucket = { day: until, quantity, flag: null, row: at };
    addRow(compiled.stockNow, part, bucket);
    if (!row.nowOnly) addRow(compiled.stockComing, part, bucket);
  }
  for (const [at, row] of orders.entries()) {
    const part = find(row.partNumber);
    if (part === undefined) continue;
    const quantity = requireSteps(row.quantity, structure.decimals[part]);
    addRow(compiled.orders, part, {
      ...countsFrom(row.due, day, structure.leadTime[part]),
      quantity,
      row: at,
    });
  }
  dropEndless(compiled.stockNow);
  dropEndless(compiled.stockComing);
  for (const pool of [compiled.stockNow, compiled.stockComing, compiled.orders]) {
    for (const buckets of pool.buckets.values())
      buckets.sort((a, b) => (a.day < b.day ? -1 : a.day > b.day ? 1 : 0));
    for (const total of pool.totals.values()) compiled.wide ||= typeof total === "bigint";
  }
  return compiled;
}

function emptyPool(): Pool {
  return { totals: new Map(), buckets: new Map() };
}

function countsFrom(due: IsoDate | null, today: number, leadTime: number): Omit<Bucket, "quantity" | "row"> {
  if (due === null) return { day: today + leadTime, flag: "undated" };
  const day = dayNumber(due);
  return day < today ? { day: today + leadTime, flag: "overdue" } : { day, flag: null };
}

function addRow(pool: Pool, part: number, bucket: Bucket): void {
  pool.totals.set(part, addSteps(pool.totals.get(part) ?? (0 as Steps), bucket.quantity));
  const buckets = pool.buckets.get(part);
  if (buckets) buckets.push(bucket);
  else pool.buckets.set(part, [bucket]);
}

/** Stock that never expires needs no buckets: the total says it all. */
function dropEndless(pool: Pool): void {
  for (const [part, buckets] of pool.buckets) {
    if (buckets.every((bucket) => bucket.day === Number.POSITIVE_INFINITY)) pool.buckets.delete(part);
  }
}
