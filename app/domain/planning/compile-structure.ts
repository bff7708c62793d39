import { groupEdges } from "../graph/group-edges";
import { sortByLevel } from "../graph/sort-by-level";
import { partKey } from "./part-key";
import { findOpenParts } from "./structure/find-open-parts";
import { groupByKind } from "./structure/group-lines";
import { PartIndex } from "./structure/part-index";
import { partNumbers } from "./structure/part-numbers";
import type { ReadLines } from "./structure/read-lines";
import { CONDITIONAL, MOST_PROBLEMS, readLines } from "./structure/read-lines";
import { readParts } from "./structure/read-parts";
import type { LineGroup, Structure } from "./structure/structure";
import { BUY } from "./structure/structure";
import type { PlanLine, PlanPart, StructureProblem } from "./types";

export type CompiledStructure =
  | { ok: true; structure: Structure }
  | { ok: false; problems: StructureProblem[] };

/**
 * Numbers the parts in low-level-code order and lays the lines out in typed arrays. Refuses unknown and
 * doubled parts, loops (one, named whole) and options or effectivity where they may not stand.
 * Quantities, scrap and yields must have been checked at the door.
 */
export function compileStructure(parts: readonly PlanPart[], lines: readonly PlanLine[]): CompiledStructure {
  const problems: StructureProblem[] = [];
  const given = indexParts(parts, problems);
  const read = readLines(parts, lines, given, problems);
  if (problems.length > 0) return { ok: false, problems };
  const byParent = groupEdges(parts.length, read.parent);
  const sorted = sortByLevel(
    { nodes: parts.length, parents: read.parent, components: read.component },
    byParent,
  );
  if (!sorted.ok) return { ok: false, problems: [loopProblem(parts, sorted.loop, sorted.edge)] };
  const { order, levels } = sorted;
  const numbers = new Int32Array(parts.length);
  for (let n = 0; n < order.length; n++) numbers[order[n]] = n;
  const facts = readParts(parts, order, levels);
  const groups = groupByKind({ read, byParent, order, numbers, decimals: facts.decimals, lines });
  const open = findOpenParts(facts.sourcing, [groups.fixed, groups.conditional, groups.asRequired]);
  const misplaced = checkConditions(lines, read, numbers, open);
  if (misplaced.length > 0) return { ok: false, problems: misplaced };
  const numberOf = partNumbers(given, numbers);
  return {
    ok: true,
    structure: { ...facts, ...groups, ...findRoles(facts.sourcing, groups, open), numberOf, lines },
  };
}

type Groups = Pick<Structure, "fixed" | "conditional" | "asRequired">;

/** Which parts end the explosion, and which stand where conditions may. */
function findRoles(sourcing: Uint8Array, { fixed, conditional, asRequired }: Groups, open: Uint8Array) {
  const leaf = new Uint8Array(open.length);
  const openParts: number[] = [];
  for (let p = 0; p < open.length; p++) {
    const hasLines = hasAny(fixed, p) || hasAny(conditional, p) || hasAny(asRequired, p);
    if (!hasLines || sourcing[p] === BUY) leaf[p] = 1;
    if (hasLines && open[p] === 1) openParts.push(p);
  }
  return { leaf, open, openParts: Int32Array.from(openParts) };
}

function hasAny({ starts }: LineGroup, p: number): boolean {
  return starts[p + 1] > starts[p];
}

function indexParts(parts: readonly PlanPart[], problems: StructureProblem[]): PartIndex {
  const given = new PartIndex(parts.length);
  for (let at = 0; at < parts.length; at++) {
    const { partNumber } = parts[at];
    if (!given.add(partKey(partNumber))) problems.push({ code: "duplicate-part", part: at, partNumber });
  }
  return given;
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
  read: ReadLines,
  numbers: Int32Array,
  open: Uint8Array,
): StructureProblem[] {
  const problems: StructureProblem[] = [];
  for (let line = 0; line < lines.length && problems.length < MOST_PROBLEMS; line++) {
    if ((read.kind[line] & CONDITIONAL) === 0 || open[numbers[read.parent[line]]] === 1) continue;
    const { option, fromSerial, toSerial, fromDate, parent } = lines[line];
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
    problems.push({ code: "condition-not-allowed", line, column, parent });
  }
  return problems;
}
