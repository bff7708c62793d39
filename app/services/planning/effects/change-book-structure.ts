import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import { changeStructure } from "~/domain/planning/what-if/change-structure";
import { parseSteps } from "~/domain/quantity/parse-steps";
import type { BookChange } from "~/schemas/planning/effects";
import { AppError } from "~/utils/errors";
import type { PlanBook } from "../get-plan-book.server";
import { changeBookPart } from "../what-if/change-book-part";
import { sayStructureProblem } from "../what-if/say-structure-problem";
import { refuseChange } from "./refuse-change";

/** The structure as it would be; the very same object where the change touches no part and no line. */
export function changeBookStructure(
  { structure, rows }: Pick<PlanBook, "structure" | "rows">,
  change: Pick<BookChange, "parts" | "structure">,
): Structure {
  const parts = change.parts.map((part) => changeBookPart(structure, part, "change.parts"));
  const decimalsGiven = new Map(parts.map(({ partNumber, decimals }) => [partKey(partNumber), decimals]));
  const quantities = decimalsGiven.size === 0 ? [] : quantitiesOf(structure, rows);
  for (const { partNumber, quantity } of quantities) {
    const decimals = decimalsGiven.get(partKey(partNumber));
    if (decimals === undefined || quantity === null || parseSteps(quantity, decimals).ok) continue;
    const message = `${quantity} of ${partNumber} is in the book: ${decimals} decimals are too few.`;
    throw refuseChange("parts", partNumber, message);
  }
  checkLines(change.structure, (partNumber) => {
    const key = partKey(partNumber);
    return decimalsGiven.get(key) ?? structure.decimals[structure.numberOf.get(key) ?? -1];
  });
  const compiled = changeStructure(structure, { parts, structure: change.structure });
  if (!compiled.ok) {
    const errors = compiled.problems.map((problem) => sayStructureProblem(problem, "change"));
    throw new AppError("invalid", errors[0].message, { errors });
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
  decimalsOf: (partNumber: string) => number | undefined,
): void {
  replaced.forEach(({ lines }, at) => {
    lines.forEach(({ component, quantity }, line) => {
      const decimals = decimalsOf(component);
      if (quantity === null || decimals === undefined || parseSteps(quantity, decimals).ok) return;
      const message = `${quantity} does not fit: ${component} is counted with ${decimals} decimals.`;
      throw refuseChange(`structure.${at}.lines.${line}.quantity`, quantity, message);
    });
  });
}
