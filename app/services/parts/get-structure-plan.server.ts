import { explainStart } from "~/domain/planning/explain-need";
import { offeredOptions } from "~/domain/planning/netting/split-demand";
import type { ShipPlan } from "~/domain/planning/plan-ship";
import type { Structure } from "~/domain/planning/structure/structure";
import { formatSteps } from "~/domain/quantity/format-steps";
import type { StructurePart, StructurePlan, StructureRow } from "~/schemas/parts/structure-plan";
import { planDemand } from "~/services/planning/plan-demand.server";
import { findBookPart } from "./book-part.server";
import { linesOf } from "./lines-of";

/** A tree with more places than this shows the parts of a subassembly at its first place alone. */
const MOST_PLACES = 20_000;

/**
 * A part's structure as a tree, depth first, with what so many of it need, take from stock, start and lack. Figures of
 * a part are those of the whole plan and the same at each of its places; the need of a row is what its line asks for.
 * @throws AppError "not-found" for an unknown part, "invalid" for options that do not fit
 */
export async function getStructurePlan(
  partNumber: string,
  { kits, options }: { kits: number; options: string[] },
): Promise<StructurePlan> {
  const { book, number } = await findBookPart(partNumber);
  const { structure } = book;
  const top = book.parts[number];
  const demand = { partNumber: top.partNumber, quantity: String(kits), due: null, options, serial: null };
  const plan = planDemand(book, [demand], "strict");
  const walk = walkTree(structure, number, needsByLine(plan));
  return {
    partNumber: top.partNumber,
    description: top.description,
    kits,
    options,
    offered: offeredOptions(structure, number),
    isSold: top.sold,
    today: book.day,
    parts: walk.parts.map(({ part, places }) =>
      presentPart(plan, book.parts[part].description, part, places),
    ),
    rows: walk.rows,
  };
}

/** What each line asks for in all of the plan. */
function needsByLine({
  structure,
  served,
}: ShipPlan): (line: number, part: number, parent: number) => string | null {
  const known = new Map<number, Map<number, string>>();
  return (line, part, parent) => {
    let needs = known.get(parent);
    if (needs === undefined) {
      const causes = explainStart(structure, served.now, served.before.now, parent);
      needs = new Map(
        causes.map((cause) => [cause.line, formatSteps(cause.need, structure.decimals[cause.component])]),
      );
      known.set(parent, needs);
    }
    return (
      needs.get(line) ?? (served.now.start[parent] > 0 ? null : formatSteps(0, structure.decimals[part]))
    );
  };
}

interface Walk {
  parts: { part: number; places: number }[];
  rows: StructureRow[];
}

/** Places of the tree below each part, itself included, up to a limit: parts below have larger numbers. */
function countPlaces(structure: Structure, top: number): number {
  const places = new Map<number, number>();
  for (let part = structure.parts.length - 1; part >= top; part--) {
    const below = linesOf(structure, part).reduce(
      (sum, { component }) => sum + (places.get(component) ?? 1),
      1,
    );
    places.set(part, Math.min(below, Number.MAX_SAFE_INTEGER));
  }
  return places.get(top) ?? 1;
}

function walkTree(structure: Structure, top: number, needOf: ReturnType<typeof needsByLine>): Walk {
  const repeats = countPlaces(structure, top) <= MOST_PLACES;
  const index = new Map<number, number>();
  const firstRow = new Map<number, number>();
  const walk: Walk = { parts: [], rows: [] };
  const place = (part: number): number => {
    const known = index.get(part) ?? walk.parts.push({ part, places: 0 }) - 1;
    index.set(part, known);
    walk.parts[known].places++;
    return known;
  };
  const open: { part: number; level: number; row: Omit<StructureRow, "part" | "level" | "at"> }[] = [
    {
      part: top,
      level: 1,
      row: { quantity: null, isAsRequired: false, scrap: null, option: null, need: null },
    },
  ];
  for (let next = open.pop(); next !== undefined; next = open.pop()) {
    const { part, level, row } = next;
    const lines = linesOf(structure, part);
    const first = firstRow.get(part);
    const isRepeat = first !== undefined && !repeats && lines.length > 0;
    if (first === undefined) firstRow.set(part, walk.rows.length);
    walk.rows.push({ ...row, level, part: place(part), at: isRepeat ? first : null });
    if (isRepeat) continue;
    for (const { component, line } of lines.toReversed()) {
      const { quantity, scrap, option } = structure.lines[line];
      const need = quantity === null ? null : needOf(line, component, part);
      const cells = {
        quantity,
        isAsRequired: quantity === null,
        scrap: Number(scrap) > 0 ? scrap : null,
        option,
        need,
      };
      open.push({ part: component, level: level + 1, row: cells });
    }
  }
  return walk;
}

function presentPart(
  { structure, served }: ShipPlan,
  description: string,
  part: number,
  places: number,
): StructurePart {
  const { partNumber, unit, decimals, sourcing } = structure.parts[part];
  const { gross, fromStock, net, start } = served.now;
  const write = (steps: (typeof gross)[number]) => formatSteps(steps, decimals);
  const isLeaf = structure.leaf[part] === 1;
  return {
    partNumber,
    description,
    unit,
    decimals,
    sourcing,
    needed: write(gross[part]),
    fromStock: write(fromStock[part]),
    built: isLeaf ? null : write(start[part]),
    missing: isLeaf ? write(net[part]) : null,
    places,
  };
}
