import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import { changeStructure } from "~/domain/planning/what-if/change-structure";
import { parseSteps } from "~/domain/quantity/parse-steps";
import type { BookChange } from "~/schemas/planning/effects";
import { AppError, type FieldError } from "~/utils/errors";
import type { PlanBook } from "../get-plan-book.server";
import { changeBookPart } from "./change-book-part";
import { sayStructureProblem } from "./say-structure-problem";

/**
 * The structure as it would be; the very same object where the change touches no part and no line. Throws 422 for
 * what cannot be planned; `within` is the field of the question that holds the change.
 */
export function changeBookStructure(
  { structure, rows }: Pick<PlanBook, "structure" | "rows">,
  change: Pick<BookChange, "parts" | "structure">,
  within: "change" | "whatIf",
): Structure {
  const parts = change.parts.map((part) => changeBookPart(structure, part, `${within}.parts`));
  const decimalsGiven = new Map(parts.map(({ partNumber, decimals }) => [partKey(partNumber), decimals]));
  const quantities = decimalsGiven.size === 0 ? [] : quantitiesOf(structure, rows);
  for (const { partNumber, quantity } of quantities) {
    const decimals = decimalsGiven.get(partKey(partNumber));
    if (decimals === undefined || quantity === null || parseSteps(quantity, decimals).ok) continue;
    const message = `${quantity} of ${partNumber} is in the book: ${decimals} decimals are too few.`;
    throw refusal([{ field: `${within}.parts`, value: partNumber, message }]);
  }
  checkLines(change.structure, `${within}.structure`, (partNumber) => {
    const key = partKey(partNumber);
    return decimalsGiven.get(key) ?? structure.decimals[structure.numberOf.get(key) ?? -1];
  });
  const compiled = changeStructure(structure, { parts, structure: change.structure });
  if (!compiled.ok) {
    throw refusal(compiled.problems.map((problem) => sayStructureProblem(problem, within)));
  }
  return compiled.structure;
}

/** Every quantity of a part that is written down in the plan. */
function* quantitiesOf(structure: Structure, { shelves, orders }: PlanBook["rows"]) {
  for (const { component, quantity } of structure.lines) yield { partNumber: component, quantity };
  for (const list of [shelves.usable, shelves.promised, shelves.picked, orders]) yield* list;
}

/** A part that is not in the book has no decimals; what is wrong with it is said when the lines are compiled. */
function checkLines(
  replaced: BookChange["structure"],
  field: string,
  decimalsOf: (partNumber: string) => number | undefined,
): void {
  for (const { component, quantity } of replaced.flatMap(({ lines }) => lines)) {
    const decimals = decimalsOf(component);
    if (quantity === null || decimals === undefined || parseSteps(quantity, decimals).ok) continue;
    const message = `${quantity} does not fit: ${component} is counted with ${decimals} decimals.`;
    throw refusal([{ field, value: component, message }]);
  }
}

function refusal(errors: FieldError[]): AppError {
  return new AppError("invalid", errors[0].message, { errors });
}
