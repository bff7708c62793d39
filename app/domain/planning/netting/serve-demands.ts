import type { Steps } from "../../quantity/steps";
import { addSteps, subtractSteps } from "../../quantity/steps";
import type { Supplies } from "../compile-supplies";
import { criticalChain } from "../dates/critical-chain";
import { NEVER, needForSegment, spreadNeed } from "../dates/need-dates";
import { readyDates, readyForSegment } from "../dates/ready-dates";
import type { Structure } from "../structure/structure";
import type { ChainLink } from "../types";
import { countShippable } from "./count-shippable";
import { findFirstStops } from "./find-first-stops";
import type { Lane, Offer } from "./lane";
import { addsNoShortage, keepKits, offerTo, openLane, tryKits } from "./lane";
import type { Engine, PassState } from "./pass-state";
import type { Segment } from "./split-demand";

/** Most rungs that a ladder draws. */
export const MOST_RUNGS = 1000;

/** One rung of the ladder, by part numbers of the structure. */
export interface ServedRung {
  part: number;
  kits: number;
  stoppers: { part: number; missing: Steps }[];
  /** Short in the pass *coming*. */
  short: { part: number; short: Steps }[];
  readyOn: number;
}

/** Everything the answer is made of, after all demands are served. */
export interface Served {
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
  needBy: Int32Array;
  /** 1 where a demand with, or without, a date is short of the part. */
  shortDated: Uint8Array;
  shortUndated: Uint8Array;
}

interface Run extends Omit<Served, "now" | "coming" | "all" | "lanes"> {
  structure: Structure;
  supplies: Supplies;
  nowLane: Lane;
  comingLane: Lane;
  allLane: Lane;
  served: Steps;
  latest: number;
}

/** Serves the segments in the order given: both passes, ladder, dates (PLANNING.md, sections 3 to 5). */
export function serveDemands(
  structure: Structure,
  supplies: Supplies,
  segments: readonly Segment[],
  engine: Engine,
): Served {
  const run = openRun(structure, supplies, segments, engine);
  for (const segment of segments) serveSegment(run, segment);
  const { nowLane, comingLane, allLane } = run;
  readyDates(structure, supplies, allLane.state, run.ready);
  spreadNeed(structure, comingLane.state, run.needBy);
  return {
    ...run,
    lanes: { now: nowLane },
    now: nowLane.state,
    coming: comingLane.state,
    all: allLane.state,
  };
}

function openRun(
  structure: Structure,
  supplies: Supplies,
  segments: readonly Segment[],
  engine: Engine,
): Run {
  const { stockNow, stockComing, orders, today } = supplies;
  const base = { structure, engine, today };
  const dated = segments.some((segment) => segment.due !== null);
  const comingLane = openLane({ ...base, stock: stockComing, orders, byDate: true });
  const parts = structure.parts.length;
  return {
    structure,
    supplies,
    nowLane: openLane({ ...base, stock: stockNow, orders: null, byDate: false }),
    comingLane,
    allLane: dated ? openLane({ ...base, stock: stockComing, orders, byDate: false }) : comingLane,
    served: 0,
    latest: Number.NEGATIVE_INFINITY,
    rungs: [],
    shippable: [],
    earliest: [],
    ready: new Int32Array(parts),
    chain: [],
    stopsAt: new Map(),
    needBy: new Int32Array(parts).fill(NEVER),
    shortDated: new Uint8Array(parts),
    shortUndated: new Uint8Array(parts),
  };
}

interface Offers {
  now: Offer;
  coming: Offer;
  all: Offer;
}

function serveSegment(run: Run, segment: Segment): void {
  const { nowLane, comingLane, allLane } = run;
  const offers = {
    now: offerTo(nowLane, segment),
    coming: offerTo(comingLane, segment),
    all: offerTo(allLane, segment),
  };
  const climbed = climbRungs(run, segment, offers);
  if (climbed.rungs < segment.kits) {
    tryLanes(run, segment, offers, segment.kits);
    if (climbed.free === climbed.rungs) {
      climbed.free = countShippable(nowLane, segment, climbed.free, segment.kits);
      tryKits(nowLane, offers.now, segment, segment.kits);
    }
    findFirstStops(nowLane, offers.now, segment, climbed.rungs, run.served, run.stopsAt);
    tryKits(nowLane, offers.now, segment, segment.kits);
  }
  const readyOn = dateSegment(run, segment);
  run.shippable.push(climbed.free);
  run.earliest.push(readyOn);
  keepNeeds(run, segment);
  keepChain(run, segment, readyOn);
  for (const lane of new Set([nowLane, comingLane, allLane])) keepKits(lane, segment);
  run.latest = Math.max(run.latest, readyOn);
  run.served = addSteps(run.served, segment.kits);
}

/** One rung a kit, as many as the ladder has room for; `free` counts those that lack nothing new. */
function climbRungs(run: Run, segment: Segment, offers: Offers): { rungs: number; free: Steps } {
  const room = MOST_RUNGS - run.rungs.length;
  const rungs = segment.kits < room ? Number(segment.kits) : room;
  let free = 0;
  for (let kits = 1; kits <= rungs; kits++) {
    tryLanes(run, segment, offers, kits);
    const { structure, nowLane } = run;
    if (free === kits - 1 && addsNoShortage(structure, nowLane.state, nowLane.next)) free = kits;
    const at = Number(run.served) + kits;
    const stoppers = lackOf(structure, nowLane.next).map(({ part, lack }) => ({ part, missing: lack }));
    for (const { part } of stoppers) if (!run.stopsAt.has(part)) run.stopsAt.set(part, at);
    const short = lackOf(structure, run.comingLane.next).map(({ part, lack }) => ({ part, short: lack }));
    const readyOn = Math.max(run.latest, dateSegment(run, segment));
    run.rungs.push({ part: segment.part, kits: at, stoppers, short, readyOn });
  }
  return { rungs, free };
}

function tryLanes(run: Run, segment: Segment, offers: Offers, kits: Steps): void {
  tryKits(run.nowLane, offers.now, segment, kits);
  tryKits(run.comingLane, offers.coming, segment, kits);
  if (run.allLane !== run.comingLane) tryKits(run.allLane, offers.all, segment, kits);
}

function lackOf(structure: Structure, state: PassState): { part: number; lack: Steps }[] {
  const lacking: { part: number; lack: Steps }[] = [];
  const { leaf } = structure;
  const { net } = state;
  for (let p = 0; p < leaf.length; p++) if (leaf[p] && net[p] > 0) lacking.push({ part: p, lack: net[p] });
  return lacking;
}

/** The day on which the kits of the last try are complete. */
function dateSegment(run: Run, segment: Segment): number {
  const { structure, supplies, allLane, ready } = run;
  readyDates(structure, supplies, allLane.next, ready);
  readyForSegment(structure, supplies, allLane.state, allLane.next, segment, ready);
  return ready[segment.part];
}

function keepNeeds(run: Run, segment: Segment): void {
  const { structure, comingLane } = run;
  const { state, next } = comingLane;
  needForSegment(structure, state, next, segment, run.needBy);
  const short = segment.due === null ? run.shortUndated : run.shortDated;
  for (let p = 0; p < structure.leaf.length; p++) {
    if (structure.leaf[p] && subtractSteps(next.net[p], state.net[p]) > 0) short[p] = 1;
  }
}

function keepChain(run: Run, segment: Segment, readyOn: number): void {
  if (readyOn <= run.latest) return;
  const { structure, supplies, allLane, ready } = run;
  run.chain = criticalChain({
    structure,
    supplies,
    segment,
    base: allLane.state,
    state: allLane.next,
    ready,
  });
}
