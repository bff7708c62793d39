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
  const find = (text: string) => structure.numberOf.get(text) ?? structure.numberOf.get(partKey(text)) ?? -1;
  const parts = structure.parts.length;
  const place = new Int32Array(stock.length);
  const isDated = new Uint8Array(parts);
  let isSplit = false;
  for (let at = 0; at < stock.length; at++) {
    place[at] = find(stock[at].partNumber);
    if (place[at] < 0) continue;
    if (stock[at].expiresOn !== null) isDated[place[at]] = 1;
    if (stock[at].nowOnly) isSplit = true;
  }
  const stockNow = emptyPool(parts);
  const stockComing = isSplit ? emptyPool(parts) : stockNow;
  for (let at = 0; at < stock.length; at++) {
    const part = place[at];
    if (part < 0) continue;
    const { quantity, expiresOn, nowOnly } = stock[at];
    const steps = requireSteps(quantity, structure.decimals[part]);
    const until = expiresOn === null ? Number.POSITIVE_INFINITY : dayNumber(expiresOn);
    // Stock that never expires needs no buckets: the total says it all.
    const bucket: Bucket | null =
      isDated[part] === 1 ? { day: until, quantity: steps, flag: null, row: at } : null;
    addRow(stockNow, part, steps, bucket);
    if (isSplit && !nowOnly) addRow(stockComing, part, steps, bucket);
  }
  const open = compileOrders(structure, orders, day, find);
  for (const pool of new Set([stockNow, stockComing, open])) sortBuckets(pool);
  const wide = [stockNow, stockComing, open].some(({ totals }) => Array.isArray(totals));
  return { today: day, stockNow, stockComing, orders: open, wide };
}

function compileOrders(
  structure: Structure,
  orders: readonly PlanSupply[],
  today: number,
  find: (text: string) => number,
): Pool {
  const pool = emptyPool(structure.parts.length);
  for (let at = 0; at < orders.length; at++) {
    const { partNumber, quantity, due } = orders[at];
    const part = find(partNumber);
    if (part < 0) continue;
    const steps = requireSteps(quantity, structure.decimals[part]);
    const when = countsFrom(due, today, structure.leadTime[part]);
    addRow(pool, part, steps, { ...when, quantity: steps, row: at });
  }
  return pool;
}

function emptyPool(parts: number): Pool {
  return { totals: new Float64Array(parts), buckets: new Map() };
}

function countsFrom(due: IsoDate | null, today: number, leadTime: number): Omit<Bucket, "quantity" | "row"> {
  if (due === null) return { day: today + leadTime, flag: "undated" };
  const day = dayNumber(due);
  return day < today ? { day: today + leadTime, flag: "overdue" } : { day, flag: null };
}

function addRow(pool: Pool, part: number, steps: Steps, bucket: Bucket | null): void {
  const total = addSteps(pool.totals[part], steps);
  if (typeof total === "bigint" && !Array.isArray(pool.totals))
    pool.totals = Array.from(pool.totals as Float64Array);
  pool.totals[part] = total;
  if (bucket === null) return;
  const buckets = pool.buckets.get(part);
  if (buckets) buckets.push(bucket);
  else pool.buckets.set(part, [bucket]);
}

function sortBuckets(pool: Pool): void {
  for (const buckets of pool.buckets.values()) {
    if (buckets.length > 1) buckets.sort((a, b) => (a.day < b.day ? -1 : a.day > b.day ? 1 : 0));
  }
}
