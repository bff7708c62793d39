import type { StructureProblem } from "~/domain/planning/types";
import type { FieldError } from "~/utils/errors";

/** A sentence for what a tried structure cannot be planned with; `within` is the field that holds the change. */
export function sayStructureProblem(problem: StructureProblem, within: string): FieldError {
  const field = `${within}.structure`;
  switch (problem.code) {
    case "loop":
      return { field, message: `The structure would run in a loop: ${problem.loop.join(" > ")}.` };
    case "unknown-part":
      return {
        field,
        value: problem.partNumber,
        message: `There is no part ${problem.partNumber} in the book.`,
      };
    case "duplicate-part":
      return {
        field: `${within}.parts`,
        value: problem.partNumber,
        message: `${problem.partNumber} stands there twice.`,
      };
    case "condition-not-allowed":
      return {
        field,
        value: problem.parent,
        message: `Options and effectivity may not stand on ${problem.parent}: only on kits and phantoms used only under kits.`,
      };
  }
}
