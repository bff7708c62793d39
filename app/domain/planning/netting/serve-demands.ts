import type { Steps } from "../../quantity/steps";
import { addSteps, subtractSteps } from "../../quantity/steps";
import type { Supplies } from "../compile-supplies";
import { criticalChain } from "../dates/critical-chain";
import { addNeeds, emptyNeeds } from "../dates/need-dates";
import { readyDates, readyForSegment } from "../dates/ready-dates";
import type { Structure } from "../structure/structure";
import { countShippable } from "./count-shippable";
import { findFirstStops } from "./find-first-stops";
import type { Lane, Offer } from "./lane";
import { addsNoShortage, keepKits, offerTo, openLane, tryKits } from "./lane";
import { copyState, type Engine, emptyState, type PassState } from "./pass-state";
import { copyLeft, type Left } from "./pool";
import { type LeftOver, MOST_RUNGS, type Served } from "./served";
import type { Segment } from "./split-demand";

interface Run extends Omit<Served, "now" | "coming" | "all" | "lanes" | "left"> {
  structure: Structure;
  supplies: Supplies;
  nowLane: Lane;
  comingLane: Lane;
  allLane: Lane;
  served: Steps;
  latest: number;
  /** Where the demands that are alike began in the pass *coming*. */
  groupBase: PassState;
}

export interface ServeInput {
  structure: Structure;
  supplies: Supplies;
  /** Served first, without rungs: the answer is what comes on top of them. */
  first: readonly Segment[];
  segments: readonly Segment[];
  engine: Engine;
}

/** Serves the segments in the order given: both passes, ladder, dates (PLANNING.md, sections 3 to 5). */
export function serveDemands(input: ServeInput): Served {
  const { structure, supplies, first, segments, engine } = input;
  const run = openRun(input);
  if (first.length > 0) {
    for (const segment of first) serveSilently(run, segment);
    run.before = {
      now: copyState(run.nowLane.state, engine),
      coming: copyState(run.comingLane.state, engine),
    };
    run.groupBase = run.before.coming;
  }
  const before = leftOver(run, copyLeft);
  segments.forEach((segment, at) => {
    serveSegment(run, segment);
    if (segment.alike === segments[at + 1]?.alike) return;
    addGroupNeeds(run, segment);
    if (at + 1 < segments.length) run.groupBase = copyState(run.comingLane.state, engine);
  });
  const { nowLane, comingLane, allLane } = run;
  readyDates(structure, supplies, allLane.state, run.ready);
  return {
    ...run,
    lanes: { now: nowLane },
    left: { before, after: leftOver(run, (left) => left) },
    now: nowLane.state,
    coming: comingLane.state,
    all: allLane.state,
  };
}

function leftOver({ nowLane, comingLane }: Run, as: (left: Left) => Left): LeftOver {
  return {
    now: as(nowLane.stockLeft),
    coming: as(comingLane.stockLeft),
    orders: as(comingLane.ordersLeft),
  };
}

function openRun({ structure, supplies, first, segments, engine }: ServeInput): Run {
  const { stockNow, stockComing, orders, today } = supplies;
  const base = { structure, engine, today };
  const dated = [...first, ...segments].some((segment) => segment.due !== null);
  const nothing = emptyState(structure, engine);
  const comingLane = openLane({ ...base, stock: stockComing, orders, byDate: true });
  const parts = structure.parts.length;
  return {
    structure,
    supplies,
    nowLane: openLane({ ...base, stock: stockNow, orders: null, byDate: false }),
    comingLane,
    allLane: dated ? openLane({ ...base, stock: stockComing, orders, byDate: false }) : comingLane,
    before: { now: nothing, coming: nothing },
    served: 0,
    latest: Number.NEGATIVE_INFINITY,
    rungs: [],
    shippable: [],
    earliest: [],
    ready: new Int32Array(parts),
    chain: [],
    stopsAt: new Map(),
    needs: emptyNeeds(structure),
    groupBase: nothing,
  };
}

interface Lacking {
  part: number;
  lack: Steps;
}

interface Offers {
  now: Offer;
  coming: Offer;
  all: Offer;
}

function offersTo({ nowLane, comingLane, allLane }: Run, segment: Segment): Offers {
  return {
    now: offerTo(nowLane, segment),
    coming: offerTo(comingLane, segment),
    all: offerTo(allLane, segment),
  };
}

function serveSilently(run: Run, segment: Segment): void {
  tryLanes(run, segment, offersTo(run, segment), segment.kits);
  for (const lane of lanesOf(run)) keepKits(lane, segment);
}

function lanesOf({ nowLane, comingLane, allLane }: Run): Set<Lane> {
  return new Set([nowLane, comingLane, allLane]);
}

function serveSegment(run: Run, segment: Segment): void {
  const { nowLane } = run;
  const offers = offersTo(run, segment);
  const climbed = climbRungs(run, segment, offers);
  if (climbed.rungs < segment.kits) {
    tryLanes(run, segment, offers, segment.kits);
    if (climbed.free === climbed.rungs) {
      climbed.free = countShippable(nowLane, segment, climbed.free, segment.kits);
      tryKits(nowLane, offers.now, segment, segment.kits);
    }
    findFirstStops({ ...run, lane: nowLane, offer: offers.now, segment, rungs: climbed.rungs });
    tryKits(nowLane, offers.now, segment, segment.kits);
  }
  const readyOn = dateSegment(run, segment);
  run.shippable.push(climbed.free);
  run.earliest.push(readyOn);
  keepChain(run, segment, readyOn);
  for (const lane of lanesOf(run)) keepKits(lane, segment);
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
    const { nowLane, comingLane } = run;
    if (free === kits - 1 && addsNoShortage(nowLane)) free = kits;
    const at = Number(run.served) + kits;
    const short = lackOf(comingLane, comingLane.next, run.before.coming);
    const readyOn = Math.max(run.latest, dateSegment(run, segment));
    const shortOf = new Map(short.map(({ part, lack }) => [part, lack]));
    const stoppers = lackOf(nowLane, nowLane.next, run.before.now).map(({ part, lack }) => ({
      part,
      missing: lack,
      readyOn: run.ready[part],
      short: shortOf.get(part) ?? 0,
    }));
    for (const { part } of stoppers) if (!run.stopsAt.has(part)) run.stopsAt.set(part, at);
    run.rungs.push({
      part: segment.part,
      kits: at,
      stoppers,
      short: short.map(({ part, lack }) => ({ part, short: lack })),
      readyOn,
    });
  }
  return { rungs, free };
}

function tryLanes(run: Run, segment: Segment, offers: Offers, kits: Steps): void {
  tryKits(run.nowLane, offers.now, segment, kits);
  tryKits(run.comingLane, offers.coming, segment, kits);
  if (run.allLane !== run.comingLane) tryKits(run.allLane, offers.all, segment, kits);
}

/** Leaves that lack more than they did before the kits asked for. */
function lackOf({ structure, engine }: Lane, { net }: PassState, before: PassState): Lacking[] {
  const parts = engine.grown(structure.leaf, net, before.net);
  return parts.map((part) => ({ part, lack: subtractSteps(net[part], before.net[part]) }));
}

/** The day on which the kits of the last try are complete. */
function dateSegment(run: Run, segment: Segment): number {
  const { structure, supplies, allLane, ready } = run;
  readyDates(structure, supplies, allLane.next, ready);
  readyForSegment(structure, supplies, allLane.state, allLane.next, segment, ready);
  return ready[segment.part];
}

/** After the last of the demands that are alike: their dates. */
function addGroupNeeds(run: Run, { part, due }: Segment): void {
  const { structure, supplies, comingLane, groupBase } = run;
  addNeeds(structure, { part, due, base: groupBase, state: comingLane.state }, supplies.today, run.needs);
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
