import type { DemandProblem } from "~/domain/planning/types";

/** A demand that cannot be planned, said about the text that was typed. */
export function sayDemandProblem(problem: DemandProblem, demandText: readonly string[]): string {
  const place = `--demand ${JSON.stringify(demandText[problem.demand])}`;
  switch (problem.code) {
    case "unknown-part": {
      const kit = JSON.stringify(problem.partNumber);
      return `${place}, kit: found the unknown part ${kit}; expected a part number that the parts list has.`;
    }
    case "unknown-option": {
      const { option, partNumber, offered } = problem;
      const expected = offered.length === 0 ? `none, since ${partNumber} has no options` : offered.join(", ");
      return `${place}, options: found ${JSON.stringify(option)}; expected ${expected}.`;
    }
    case "bad-serial":
      return `${place}, serial: found ${JSON.stringify(problem.serial)}; expected a serial that ends in digits, such as 098.`;
  }
}
