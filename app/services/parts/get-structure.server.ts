import type { Sourcing } from "~/domain/planning/types";
import type { PlanBook } from "~/services/planning/get-plan-book.server";
import { AppError } from "~/utils/errors";
import { findBookPart } from "./book-part.server";
import { linesOf } from "./lines-of";

/** Nodes of one answer at most: a tree repeats a part wherever it stands, and some trees have no end to speak of. */
const MOST_NODES = 20_000;

export interface StructureNode {
  partNumber: string;
  description: string;
  sourcing: Sourcing;
  unit: string;
  /** For one of the parent; null as required, and on the top. */
  quantity: string | null;
  scrap: string | null;
  option: string | null;
  fromSerial: string | null;
  toSerial: string | null;
  fromDate: string | null;
  toDate: string | null;
  components: StructureNode[];
}

/** The part's structure as a tree, so many levels deep. Throws 422 where the tree would be too large. */
export async function getStructure(partNumber: string, levels: number): Promise<StructureNode> {
  const { book, number } = await findBookPart(partNumber);
  const top = nodeOf(book, number, null);
  let nodes = 1;
  let open = [{ node: top, part: number }];
  for (let level = 0; level < levels && open.length > 0; level++) {
    const below: typeof open = [];
    for (const { node, part } of open) {
      for (const { component, line } of linesOf(book.structure, part)) {
        if (++nodes > MOST_NODES) throw tooLarge(partNumber);
        const child = nodeOf(book, component, line);
        node.components.push(child);
        below.push({ node: child, part: component });
      }
    }
    open = below;
  }
  return top;
}

function tooLarge(partNumber: string): AppError {
  const most = MOST_NODES.toLocaleString("en-GB");
  return new AppError(
    "invalid",
    `The structure of ${partNumber} has more than ${most} places. Ask for fewer levels.`,
  );
}

function nodeOf(book: PlanBook, part: number, lineIndex: number | null): StructureNode {
  const { partNumber, description, sourcing, unit } = book.parts[part];
  const line = lineIndex === null ? null : book.structure.lines[lineIndex];
  return {
    partNumber,
    description,
    sourcing,
    unit,
    quantity: line?.quantity ?? null,
    scrap: line?.scrap ?? null,
    option: line?.option ?? null,
    fromSerial: line?.fromSerial ?? null,
    toSerial: line?.toSerial ?? null,
    fromDate: line?.fromDate ?? null,
    toDate: line?.toDate ?? null,
    components: [],
  };
}
