import type { Steps } from "../../quantity/steps";
import type { Structure } from "../structure/structure";
import { kitSteps } from "../structure/structure";
import type { Amounts, Engine, PassState } from "./pass-state";
import { copyState, emptyState } from "./pass-state";
import type { Left, Pool } from "./pool";
import { available, copyLeft, fullBuckets, takeFrom } from "./pool";
import type { Segment } from "./split-demand";

/** A number left the range in which doubles are exact: plan again in BigInt. */
export class OutOfRange extends Error {}

/** One pass kept up while demands are served one after another. */
export interface Lane {
  structure: Structure;
  engine: Engine;
  today: number;
  stock: Pool;
  stockLeft: Left;
  /** Null in the pass *now*. */
  orders: Pool | null;
  ordersLeft: Left;
  /** Leave out open orders that come after the demand's date. */
  byDate: boolean;
  /** What has been served. */
  state: PassState;
  /** The last try; becomes the state when it is kept. */
  next: PassState;
}

/** What the next kits may take. */
export interface Offer {
  stock: Amounts;
  supply: Amounts | null;
}

type LaneInput = Pick<Lane, "structure" | "engine" | "today" | "stock" | "orders" | "byDate">;

/** A lane in which nothing has been served. */
export function openLane(input: LaneInput): Lane {
  return {
    ...input,
    stockLeft: fullBuckets(input.stock),
    ordersLeft: input.orders ? fullBuckets(input.orders) : new Map(),
    state: emptyState(input.structure, input.engine),
    next: emptyState(input.structure, input.engine),
  };
}

/** A lane that goes on from here by itself: what it serves is not served in the other. */
export function branchLane(lane: Lane): Lane {
  return {
    ...lane,
    stockLeft: copyLeft(lane.stockLeft),
    ordersLeft: copyLeft(lane.ordersLeft),
    state: copyState(lane.state, lane.engine),
    next: emptyState(lane.structure, lane.engine),
  };
}

/** What the kits of the segment may take of what is left. */
export function offerTo(lane: Lane, segment: Segment): Offer {
  const { stock, stockLeft, orders, ordersLeft, state, engine } = lane;
  return {
    stock: available(stock, stockLeft, state.fromStock, engine, admitsLot(lane, segment)),
    supply: orders && available(orders, ordersLeft, state.onOrder, engine, admitsOrder(lane, segment)),
  };
}

/** Plans so many more kits without keeping them. The result is void after the next try. */
export function tryKits(lane: Lane, offer: Offer, segment: Segment, kits: Steps): PassState {
  const { structure, engine, state, next } = lane;
  const quantity = kitSteps(structure, segment.part, kits);
  const input = { part: segment.part, quantity, active: segment.active, base: state, ...offer };
  if (!engine.run(structure, input, next)) throw new OutOfRange();
  return next;
}

/** Keeps the last try: what it took is no longer there for the next. */
export function keepKits(lane: Lane, segment: Segment): void {
  const { stock, stockLeft, orders, ordersLeft, state, next } = lane;
  takeFrom(stock, stockLeft, state.fromStock, next.fromStock, admitsLot(lane, segment));
  if (orders) takeFrom(orders, ordersLeft, state.onOrder, next.onOrder, admitsOrder(lane, segment));
  lane.state = next;
  lane.next = state;
}

/** True where the kits of the last try lack nothing that was not lacking before them. */
export function addsNoShortage({ structure, state, next }: Lane): boolean {
  const { leaf } = structure;
  const before = state.net;
  const after = next.net;
  for (let p = 0; p < leaf.length; p++) if (after[p] > before[p] && leaf[p] === 1) return false;
  return true;
}

function admitsLot(lane: Lane, segment: Segment): (day: number) => boolean {
  const from = segment.due ?? lane.today;
  return (day) => day >= from;
}

function admitsOrder(lane: Lane, segment: Segment): (day: number) => boolean {
  const until = lane.byDate && segment.due !== null ? segment.due : Number.POSITIVE_INFINITY;
  return (day) => day <= until;
}
