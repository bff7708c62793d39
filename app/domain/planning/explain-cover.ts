import { type Steps, subtractSteps } from "../quantity/steps";
import type { Left, Pool } from "./netting/pool";
import type { ShipPlan } from "./plan-ship";

/** What the kits asked about take of one row of stock or one open order. Whole steps. */
export interface Taken {
  /** Index of the row as it was given. */
  row: number;
  used: Steps;
  /** The day an order counts from, or the last day a lot may be used; infinite without one. */
  day: number;
  flag: "overdue" | "undated" | null;
}

/** Null where the rows need not be told apart: none of them expires, and the total says it all. */
interface Cover {
  now: Taken[] | null;
  coming: Taken[] | null;
  orders: Taken[];
}

/** Which rows of stock and which open orders cover a part, in the order in which they are used. */
export function explainCover({ supplies, served }: ShipPlan, part: number): Cover {
  const { before, after } = served.left;
  return {
    now: takenFrom(supplies.stockNow, before.now, after.now, part),
    coming: takenFrom(supplies.stockComing, before.coming, after.coming, part),
    orders: takenFrom(supplies.orders, before.orders, after.orders, part) ?? [],
  };
}

function takenFrom(pool: Pool, before: Left, after: Left, part: number): Taken[] | null {
  const buckets = pool.buckets.get(part);
  const had = before.get(part);
  const has = after.get(part);
  if (!buckets || !had || !has) return null;
  return buckets.map(({ row, day, flag }, at) => ({ row, day, flag, used: subtractSteps(had[at], has[at]) }));
}
