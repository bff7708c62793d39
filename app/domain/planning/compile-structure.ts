import { sortByLevel } from "../graph/sort-by-level";
import { partKey } from "./part-key";
import { findOpenParts } from "./structure/find-open-parts";
import { groupLines, groupQuantityLines, storeRatio } from "./structure/group-lines";
import { yieldRatio } from "./structure/line-ratio";
import type { Ratio, Structure } from "./structure/structure";
import { BUY, isConditional, MAKE, PHANTOM } from "./structure/structure";
import type { PlanLine, PlanPart, StructureProblem } from "./types";

export type CompiledStructure =
  | { ok: true; structure: Structure }
  | { ok: false; problems: StructureProblem[] };

const SOURCING = { buy: BUY, make: MAKE, phantom: PHANTOM };
const MOST_PROBLEMS = 100;

/**
 * Numbers the parts in low-level-code order and lays the lines out in typed arrays. Refuses unknown and
 * doubled parts, loops (one, named whole) and options or effectivity where they may not stand.
 * Quantities, scrap and yields must have been checked at the door.
 */
export function compileStructure(parts: readonly PlanPart[], lines: readonly PlanLine[]): CompiledStructure {
  const problems: StructureProblem[] = [];
  const given = indexParts(parts, problems);
  const ends = resolveLines(lines, given, problems);
  if (problems.length > 0) return { ok: false, problems };
  const sorted = sortByLevel({ nodes: parts.length, parents: ends.parent, components: ends.component });
  if (!sorted.ok) return { ok: false, problems: [loopProblem(parts, sorted.loop, sorted.edge)] };
  const { order, levels } = sorted;
  const numbers = new Int32Array(parts.length);
  for (let n = 0; n < order.length; n++) numbers[order[n]] = n;
  for (let e = 0; e < lines.length; e++) {
    ends.parent[e] = numbers[ends.parent[e]];
    ends.component[e] = numbers[ends.component[e]];
  }
  const ordered = new Array<PlanPart>(parts.length);
  const sourcing = new Uint8Array(parts.length);
  const level = new Int32Array(parts.length);
  for (let n = 0; n < order.length; n++) {
    ordered[n] = parts[order[n]];
    sourcing[n] = SOURCING[ordered[n].sourcing];
    level[n] = levels[order[n]];
  }
  const open = findOpenParts(parts.length, sourcing, ends.parent, ends.component);
  const misplaced = checkConditions(lines, ends.parent, open);
  if (misplaced.length > 0) return { ok: false, problems: misplaced };
  for (const [key, at] of given) given.set(key, numbers[at]);
  return { ok: true, structure: layOut(ordered, lines, ends, { numberOf: given, level, sourcing, open }) };
}

function indexParts(parts: readonly PlanPart[], problems: StructureProblem[]): Map<string, number> {
  const given = new Map<string, number>();
  for (let at = 0; at < parts.length; at++) {
    const key = partKey(parts[at].partNumber);
    if (given.has(key)) problems.push({ code: "duplicate-part", part: at, partNumber: parts[at].partNumber });
    else given.set(key, at);
  }
  return given;
}

function resolveLines(lines: readonly PlanLine[], given: Map<string, number>, problems: StructureProblem[]) {
  const parent = new Int32Array(lines.length);
  const component = new Int32Array(lines.length);
  const find = (text: string, line: number, column: "parent" | "component") => {
    const at = given.get(text) ?? given.get(partKey(text));
    if (at !== undefined) return at;
    problems.push({ code: "unknown-part", line, column, partNumber: text });
    return 0;
  };
  let last = "";
  let lastAt = -1;
  for (let line = 0; line < lines.length && problems.length < MOST_PROBLEMS; line++) {
    const one = lines[line];
    // Lines mostly come parent by parent.
    if (lastAt < 0 || one.parent !== last) {
      last = one.parent;
      lastAt = find(last, line, "parent");
    }
    parent[line] = lastAt;
    component[line] = find(one.component, line, "component");
  }
  return { parent, component };
}

/** The loop begins with its smallest part number, so that the same loop always reads the same. */
function loopProblem(parts: readonly PlanPart[], loop: number[], line: number): StructureProblem {
  const names = loop.map((at) => parts[at].partNumber);
  let first = 0;
  for (let k = 1; k < names.length; k++) if (names[k] < names[first]) first = k;
  const turned = [...names.slice(first), ...names.slice(0, first)];
  return { code: "loop", line, loop: [...turned, turned[0]] };
}

function checkConditions(
  lines: readonly PlanLine[],
  parent: Int32Array,
  open: Uint8Array,
): StructureProblem[] {
  const problems: StructureProblem[] = [];
  for (let line = 0; line < lines.length && problems.length < MOST_PROBLEMS; line++) {
    if (open[parent[line]] || !isConditional(lines[line])) continue;
    const { option, fromSerial, toSerial, fromDate } = lines[line];
    const column =
      option !== null
        ? "option"
        : fromSerial !== null
          ? "from_serial"
          : toSerial !== null
            ? "to_serial"
            : fromDate !== null
              ? "from_date"
              : "to_date";
    problems.push({ code: "condition-not-allowed", line, column, parent: lines[line].parent });
  }
  return problems;
}

function layOut(
  parts: PlanPart[],
  lines: readonly PlanLine[],
  ends: { parent: Int32Array; component: Int32Array },
  core: Pick<Structure, "numberOf" | "level" | "sourcing" | "open">,
): Structure {
  const hasLines = new Uint8Array(parts.length);
  for (let line = 0; line < lines.length; line++) hasLines[ends.parent[line]] = 1;
  const chosen = sortByKind(lines);
  const numbers = readParts(parts, core.sourcing, hasLines);
  const quantityLines = (kind: number) =>
    groupQuantityLines({ chosen: chosen[kind], ...ends }, lines, numbers.decimals);
  return {
    ...core,
    ...numbers,
    parts,
    openParts: Int32Array.from(core.open.keys()).filter((p) => core.open[p] === 1 && hasLines[p] === 1),
    fixed: quantityLines(FIXED),
    conditional: quantityLines(CONDITIONAL),
    asRequired: groupLines(parts.length, { chosen: chosen[AS_REQUIRED], ...ends }),
    lines,
  };
}

const FIXED = 0;
const CONDITIONAL = 1;
const AS_REQUIRED = 2;

/** Indexes of the lines of each kind, in input order. */
function sortByKind(lines: readonly PlanLine[]): Int32Array[] {
  const kinds = new Uint8Array(lines.length);
  const counts = [0, 0, 0];
  for (let line = 0; line < lines.length; line++) {
    const one = lines[line];
    kinds[line] = one.quantity === null ? AS_REQUIRED : isConditional(one) ? CONDITIONAL : FIXED;
    counts[kinds[line]]++;
  }
  const chosen = counts.map((count) => new Int32Array(count));
  const filled = [0, 0, 0];
  for (let line = 0; line < lines.length; line++) chosen[kinds[line]][filled[kinds[line]]++] = line;
  return chosen;
}

function readParts(parts: PlanPart[], sourcing: Uint8Array, hasLines: Uint8Array) {
  const decimals = new Uint8Array(parts.length);
  const leadTime = new Int32Array(parts.length);
  const leaf = new Uint8Array(parts.length);
  const yieldNum = new Float64Array(parts.length).fill(1);
  const yieldDen = new Float64Array(parts.length).fill(1);
  const wideYield = new Map<number, Ratio>();
  for (let p = 0; p < parts.length; p++) {
    const part = parts[p];
    decimals[p] = part.decimals;
    leadTime[p] = part.leadTimeDays;
    leaf[p] = sourcing[p] === BUY || hasLines[p] === 0 ? 1 : 0;
    if (sourcing[p] !== MAKE || part.yield === "1") continue;
    storeRatio({ num: yieldNum, den: yieldDen, wide: wideYield }, p, yieldRatio(part.yield));
  }
  return { decimals, leadTime, leaf, yieldNum, yieldDen, wideYield };
}
