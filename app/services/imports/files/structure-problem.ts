import type { StructureProblem } from "~/domain/planning/types";
import type { StructureRow } from "~/schemas/imports/structure";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import type { ImportRow } from "./read-import-rows";

type LineProblem = Exclude<StructureProblem, { code: "duplicate-part" }>;

/** The cell names a part that is not in the parts list. */
export function unknownPart(row: ImportRow<unknown>, column: string): CsvProblem {
  const at = row.at(column);
  const found = `the unknown part ${JSON.stringify(at.value)}`;
  return { ...at, found, expected: "a part number that the parts list has" };
}

/** What the planning core refuses about a structure line, said about the cell of the file it came from. */
export function structureProblem(problem: LineProblem, row: ImportRow<StructureRow>): CsvProblem {
  switch (problem.code) {
    case "unknown-part":
      return unknownPart(row, problem.column);
    case "loop": {
      const found = `the loop ${problem.loop.join(" > ")}`;
      return { ...row.at("component"), found, expected: "a structure in which no part contains itself" };
    }
    case "condition-not-allowed":
      return {
        ...row.at(problem.column),
        expected: `an empty cell: ${problem.parent} is no kit and no phantom used only under kits, so that an option, serial or date may not stand here`,
      };
  }
}
