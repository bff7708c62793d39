import { requireSteps } from "../../quantity/parse-steps";
import type { Steps } from "../../quantity/steps";
import { dayNumber } from "../dates/day-number";
import { partKey } from "../part-key";
import type { Structure } from "../structure/structure";
import type { DemandProblem, PlanDemand, PlanLine } from "../types";
import type { Serial } from "./serial";
import { parseSerial, serialWithin } from "./serial";

/** Kits of one demand for which the same lines count. */
export interface Segment {
  /** Index of the demand as it was given. */
  demand: number;
  part: number;
  kits: Steps;
  /** Day number, or null. */
  due: number | null;
  /** 1 for each conditional line that counts. */
  active: Uint8Array;
  /** Equal for demands that ask for the same: they are one demand of the sum. */
  alike: string;
  /** Does the line count for these kits? */
  admits: (line: PlanLine) => boolean;
}

/** A demand as segments in the order of its kits. The last one of `beyond` has no end. */
export interface SplitDemand {
  segments: Segment[];
  /** How the kits would go on after the asked quantity, were there no end. */
  beyond: Segment[];
}

export type SplitResult = { ok: true; split: SplitDemand } | { ok: false; problem: DemandProblem };

/** Finds the kit, checks options and serial, and cuts the demand where effectivity by serial changes. */
export function splitDemand(
  structure: Structure,
  demand: PlanDemand,
  index: number,
  today: number,
): SplitResult {
  const { partNumber, serial } = demand;
  const part = structure.numberOf.get(partKey(partNumber));
  if (part === undefined) return { ok: false, problem: { code: "unknown-part", demand: index, partNumber } };
  const offered = offeredOptions(structure, part);
  const unknown = demand.options.find((option) => !offered.includes(option));
  if (unknown !== undefined) {
    const problem = { code: "unknown-option", demand: index, partNumber, option: unknown, offered } as const;
    return { ok: false, problem };
  }
  const first = serial === null ? null : parseSerial(serial);
  if (serial !== null && !first) return { ok: false, problem: { code: "bad-serial", demand: index, serial } };
  return { ok: true, split: cut(structure, { demand, index, part, first, today }) };
}

interface Asked {
  demand: PlanDemand;
  index: number;
  part: number;
  first: Serial | null;
  today: number;
}

function cut(structure: Structure, { demand, index, part, first, today }: Asked): SplitDemand {
  const due = demand.due === null ? null : dayNumber(demand.due);
  const options = new Set(demand.options);
  const alike = JSON.stringify([part, due, [...options].sort(), first === null ? null : index]);
  const { source } = structure.conditional;
  const segmentAt = (offset: number, kits: Steps): Segment => {
    const serial = first && { ...first, number: first.number + offset };
    const admits = (line: PlanLine) => counts(line, options, serial, due ?? today);
    const active = Uint8Array.from(source, (line) => (admits(structure.lines[line]) ? 1 : 0));
    return { demand: index, part, kits, due, active, alike, admits };
  };
  const kits = requireSteps(demand.quantity, 0);
  const split: SplitDemand = { segments: [], beyond: [] };
  const changes = first ? serialChanges(structure, first) : [];
  let from = 0;
  for (const change of changes) {
    if (change < kits) split.segments.push(segmentAt(from, change - from));
    else break;
    from = change;
  }
  const inside = typeof kits === "number" ? kits - from : kits - BigInt(from);
  split.segments.push(segmentAt(from, inside));
  from = Number(kits);
  for (const change of changes) {
    if (change <= kits) continue;
    split.beyond.push(segmentAt(from, change - from));
    from = change;
  }
  split.beyond.push(segmentAt(from, Number.MAX_SAFE_INTEGER));
  return split;
}

/** Offsets of the kits at which some line begins or ends, in order. */
function serialChanges(structure: Structure, first: Serial): number[] {
  const offsets = new Set<number>();
  for (const line of structure.conditional.source) {
    const { fromSerial, toSerial } = structure.lines[line];
    const from = fromSerial === null ? null : parseSerial(fromSerial);
    const to = toSerial === null ? null : parseSerial(toSerial);
    if (from && from.prefix === first.prefix) offsets.add(from.number - first.number);
    if (to && to.prefix === first.prefix) offsets.add(to.number + 1 - first.number);
  }
  return [...offsets].filter((offset) => offset > 0).sort((a, b) => a - b);
}

/** Does the line count for a kit with these options, this serial and this day? */
function counts(line: PlanLine, options: ReadonlySet<string>, serial: Serial | null, day: number): boolean {
  if (line.option !== null && !options.has(line.option)) return false;
  if (serial === null && line.toSerial !== null) return false;
  if (serial !== null && !serialWithin(serial, line.fromSerial, line.toSerial)) return false;
  if (line.fromDate !== null && day < dayNumber(line.fromDate)) return false;
  return line.toDate === null || day <= dayNumber(line.toDate);
}

/** Option codes that lines of the kit or of open phantoms below it name, sorted. */
export function offeredOptions(structure: Structure, kit: number): string[] {
  const codes = new Set<string>();
  const reached = new Set([kit]);
  for (const part of structure.openParts) {
    if (!reached.has(part)) continue;
    for (const group of [structure.fixed, structure.conditional, structure.asRequired]) {
      for (let k = group.starts[part]; k < group.starts[part + 1]; k++) {
        const { option } = structure.lines[group.source[k]];
        if (option !== null) codes.add(option);
        if (structure.open[group.component[k]]) reached.add(group.component[k]);
      }
    }
  }
  return [...codes].sort();
}
