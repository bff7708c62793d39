import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanLine } from "~/domain/planning/types";
import { findBookPart } from "./book-part.server";

/** A line that takes the part, with its parent. */
export interface WhereUsedLine {
  partNumber: string;
  description: string;
  /** For one of the parent; null as required. */
  quantity: string | null;
  option: string | null;
  fromSerial: string | null;
  toSerial: string | null;
}

export interface WhereUsedAnswer {
  partNumber: string;
  parents: WhereUsedLine[];
}

/** The parents that take the part directly, one entry a line, by part number. */
export async function getWhereUsed(partNumber: string): Promise<WhereUsedAnswer> {
  const { book, number } = await findBookPart(partNumber);
  const parents = linesWithComponent(book.structure, number).map(({ parent, line }) => ({
    partNumber: book.parts[parent].partNumber,
    description: book.parts[parent].description,
    quantity: line.quantity,
    option: line.option,
    fromSerial: line.fromSerial,
    toSerial: line.toSerial,
  }));
  parents.sort((a, b) => (a.partNumber < b.partNumber ? -1 : a.partNumber > b.partNumber ? 1 : 0));
  return { partNumber: book.parts[number].partNumber, parents };
}

function linesWithComponent(structure: Structure, component: number): { parent: number; line: PlanLine }[] {
  const found: { parent: number; line: PlanLine }[] = [];
  for (const group of [structure.fixed, structure.conditional, structure.asRequired]) {
    for (let parent = 0; parent < component; parent++) {
      for (let k = group.starts[parent]; k < group.starts[parent + 1]; k++) {
        if (group.component[k] === component) found.push({ parent, line: structure.lines[group.source[k]] });
      }
    }
  }
  return found;
}
