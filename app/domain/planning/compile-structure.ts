import { sortByLevel } from "../graph/sort-by-level";
import { partKey } from "./part-key";
import { findOpenParts } from "./structure/find-open-parts";
import type { ChosenLines } from "./structure/group-lines";
import { groupLines, groupQuantityLines, storeRatio } from "./structure/group-lines";
import { yieldRatio } from "./structure/line-ratio";
import type { Structure } from "./structure/structure";
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
  const ordered = Array.from(order, (at) => parts[at]);
  const sourcing = Uint8Array.from(ordered, (part) => SOURCING[part.sourcing]);
  const open = findOpenParts(parts.length, sourcing, ends.parent, ends.component);
  const misplaced = checkConditions(lines, ends.parent, open);
  if (misplaced.length > 0) return { ok: false, problems: misplaced };
  for (const [key, at] of given) given.set(key, numbers[at]);
  const level = Int32Array.from(order, (at) => levels[at]);
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
  const find = (text: string) => given.get(text) ?? given.get(partKey(text));
  for (let line = 0; line < lines.length && problems.length < MOST_PROBLEMS; line++) {
    for (const column of ["parent", "component"] as const) {
      const partNumber = lines[line][column];
      const at = find(partNumber);
      if (at === undefined) problems.push({ code: "unknown-part", line, column, partNumber });
      else (column === "parent" ? parent : component)[line] = at;
    }
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
  const decimals = Uint8Array.from(parts, (part) => part.decimals);
  const choose = (kind: number): ChosenLines => {
    const kinds = Int32Array.from(lines.keys()).filter((line) => kindOf(lines[line]) === kind);
    return { chosen: kinds, ...ends };
  };
  const hasLines = new Uint8Array(parts.length);
  for (const p of ends.parent) hasLines[p] = 1;
  const leaf = core.sourcing.map((sourcing, p) => (sourcing === BUY || !hasLines[p] ? 1 : 0));
  return {
    ...core,
    ...compileYields(parts, core.sourcing),
    parts,
    decimals,
    leadTime: Int32Array.from(parts, (part) => part.leadTimeDays),
    leaf,
    openParts: Int32Array.from(core.open.keys()).filter((p) => core.open[p] === 1 && hasLines[p] === 1),
    fixed: groupQuantityLines(choose(0), lines, decimals),
    conditional: groupQuantityLines(choose(1), lines, decimals),
    asRequired: groupLines(parts.length, choose(2)),
    lines,
  };
}

function kindOf(line: PlanLine): number {
  if (line.quantity === null) return 2;
  return isConditional(line) ? 1 : 0;
}

function compileYields(parts: PlanPart[], sourcing: Uint8Array) {
  const yieldNum = new Float64Array(parts.length).fill(1);
  const yieldDen = new Float64Array(parts.length).fill(1);
  const wideYield = new Map<number, { num: bigint; den: bigint }>();
  for (let p = 0; p < parts.length; p++) {
    if (sourcing[p] !== MAKE || parts[p].yield === "1") continue;
    storeRatio({ num: yieldNum, den: yieldDen, wide: wideYield }, p, yieldRatio(parts[p].yield));
  }
  return { yieldNum, yieldDen, wideYield };
}
