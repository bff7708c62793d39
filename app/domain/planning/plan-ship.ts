import type { Steps } from "../quantity/steps";
import { addSteps } from "../quantity/steps";
import type { Supplies } from "./compile-supplies";
import { countBeyond } from "./netting/count-shippable";
import type { PartDebt } from "./netting/find-debts";
import { findDebts } from "./netting/find-debts";
import { branchLane, OutOfRange } from "./netting/lane";
import { isLimited } from "./netting/limits";
import type { Engine } from "./netting/pass-state";
import { numberEngine } from "./netting/run-pass";
import { wideEngine } from "./netting/run-wide-pass";
import { serveDemands } from "./netting/serve-demands";
import { releaseOrder, stockTakenByDemand } from "./netting/serve-released";
import type { Served } from "./netting/served";
import type { Segment, SplitDemand } from "./netting/split-demand";
import { splitDemand } from "./netting/split-demand";
import type { Structure } from "./structure/structure";
import type { DemandProblem, PlanDemand, Sharing } from "./types";

export interface PlanShipInput {
  structure: Structure;
  supplies: Supplies;
  /** In the order of service, at least one. */
  demand: readonly PlanDemand[];
  sharing: Sharing;
  /** Served before the demands and left out of the answer, such as the open kit orders. */
  first?: readonly PlanDemand[];
}

/** The plan in whole steps and numbers of the structure; `presentShipCheck` makes the answer of it. */
export interface ShipPlan {
  structure: Structure;
  supplies: Supplies;
  demand: readonly PlanDemand[];
  /** In the order in which they were served. */
  segments: Segment[];
  served: Served;
  /** Complete kits by demand; null where nothing limits them. */
  buildable: (Steps | null)[];
  /** Day by demand. */
  earliest: number[];
  /** Only with `release`. */
  debts: PartDebt[] | null;
}

export type PlanShipResult = { ok: true; plan: ShipPlan } | { ok: false; problems: DemandProblem[] };

/**
 * Plans the demands over the structure: now and coming, ladder, dates, debts. Exact: in doubles as long
 * as every quantity stays below 2^53 steps, else all of it in BigInt.
 */
export function planShip(input: PlanShipInput): PlanShipResult {
  const { structure, supplies, demand, first = [] } = input;
  const asked = splitAll(structure, demand, supplies.today);
  if (!asked.ok) return asked;
  const earlier = splitAll(structure, first, supplies.today);
  if (!earlier.ok) throw new Error("What is served first cannot be planned.");
  const work = { ...input, splits: asked.splits, before: earlier.splits.flatMap(({ segments }) => segments) };
  const kits = [...work.before, ...asked.splits.flatMap(({ segments }) => segments)];
  if (supplies.wide || kits.some((segment) => typeof segment.kits === "bigint")) {
    return { ok: true, plan: plan(work, wideEngine) };
  }
  try {
    return { ok: true, plan: plan(work, numberEngine) };
  } catch (error) {
    if (!(error instanceof OutOfRange)) throw error;
    return { ok: true, plan: plan(work, wideEngine) };
  }
}

type SplitAll = { ok: true; splits: SplitDemand[] } | { ok: false; problems: DemandProblem[] };

function splitAll(structure: Structure, demand: readonly PlanDemand[], today: number): SplitAll {
  const results = demand.map((one, index) => splitDemand(structure, one, index, today));
  const problems = results.flatMap((result) => (result.ok ? [] : [result.problem]));
  if (problems.length > 0) return { ok: false, problems };
  return { ok: true, splits: results.flatMap((result) => (result.ok ? [result.split] : [])) };
}

interface PlanWork extends PlanShipInput {
  before: Segment[];
  splits: SplitDemand[];
}

function plan(work: PlanWork, engine: Engine): ShipPlan {
  const { structure, supplies, demand, sharing, before, splits } = work;
  const asked = splits.flatMap((split) => split.segments);
  const base = { structure, supplies, engine, first: before };
  const release = sharing === "release" ? releaseOrder({ ...base, splits }) : null;
  const segments = release ? release.segments : asked;
  const served = serveDemands({ ...base, segments });
  const takenBy = (order: Segment[]) =>
    stockTakenByDemand({ ...base, segments: order, demands: demand.length });
  return {
    structure,
    supplies,
    demand,
    segments,
    served,
    buildable: markEndless(structure, splits, release?.buildable ?? strictBuildable(splits, served)),
    earliest: latestByDemand(segments, served.earliest, demand.length),
    debts: release ? findDebts(takenBy(asked), takenBy(segments)) : null,
  };
}

/**
 * Each demand up to its quantity, since others are served after it; the last one as far as it goes. Within
 * a demand the first kit that is stopped ends the count.
 */
function strictBuildable(splits: readonly SplitDemand[], served: Served): (Steps | null)[] {
  let next = 0;
  return splits.map((split, index) => {
    const first = next;
    next += split.segments.length;
    let sum: Steps = 0;
    for (let at = first; at < next; at++) {
      sum = addSteps(sum, served.shippable[at]);
      if (served.shippable[at] !== split.segments[at - first].kits) return sum;
    }
    if (index < splits.length - 1) return sum;
    const more = countBeyond(branchLane(served.lanes.now), split.beyond);
    return more === null ? null : addSteps(sum, more);
  });
}

/** A kit that nothing limits has no number, wherever it stands in the order of service. */
function markEndless(
  structure: Structure,
  splits: readonly SplitDemand[],
  buildable: (Steps | null)[],
): (Steps | null)[] {
  return buildable.map((count, index) => {
    const all = [...splits[index].segments, ...splits[index].beyond];
    return all.some(({ part, active }) => isLimited(structure, part, active)) ? count : null;
  });
}

function latestByDemand(segments: readonly Segment[], days: readonly number[], demands: number): number[] {
  const latest = new Array<number>(demands).fill(Number.NEGATIVE_INFINITY);
  segments.forEach((segment, at) => {
    latest[segment.demand] = Math.max(latest[segment.demand], days[at]);
  });
  return latest;
}
