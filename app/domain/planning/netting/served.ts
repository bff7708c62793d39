import type { Steps } from "../../quantity/steps";
import type { NeedDates } from "../dates/need-dates";
import type { ChainLink } from "../types";
import type { Lane } from "./lane";
import type { PassState } from "./pass-state";
import type { Left } from "./pool";

/** Most rungs that a ladder draws. */
export const MOST_RUNGS = 1000;

/** A part that a rung lacks here and now, with its day and what is not even on order. */
export interface Stopper {
  part: number;
  missing: Steps;
  readyOn: number;
  short: Steps;
}

/** One rung of the ladder, by part numbers of the structure. */
export interface ServedRung {
  part: number;
  kits: number;
  stoppers: Stopper[];
  /** Short in the pass *coming*. */
  short: { part: number; short: Steps }[];
  readyOn: number;
}

/** Left in each bucket: stock of the pass *now*, stock and open orders of the pass *coming*. */
export interface LeftOver {
  now: Left;
  coming: Left;
  orders: Left;
}

/** Everything the answer is made of, after all demands are served. */
export interface Served {
  /** Where the kits asked for begin: what was served before them, nothing by default. */
  before: { now: PassState; coming: PassState };
  /** What is left of stock and open orders, bucket by bucket: before the kits asked for, and after them. */
  left: { before: LeftOver; after: LeftOver };
  now: PassState;
  /** Open orders by the demands' dates. */
  coming: PassState;
  /** Every open order; the same object as `coming` where no demand has a date. */
  all: PassState;
  lanes: { now: Lane };
  rungs: ServedRung[];
  /** Complete kits by segment, in the order of service. */
  shippable: Steps[];
  /** Day by segment. */
  earliest: number[];
  ready: Int32Array;
  chain: ChainLink[];
  stopsAt: Map<number, Steps>;
  needs: NeedDates;
}
