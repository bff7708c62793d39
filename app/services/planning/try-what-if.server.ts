import { compileSupplies } from "~/domain/planning/compile-supplies";
import { partKey } from "~/domain/planning/part-key";
import { changeStock } from "~/domain/planning/what-if/change-stock";
import { changeSupply } from "~/domain/planning/what-if/change-supply";
import type { WhatIfProblem } from "~/domain/planning/what-if/what-if";
import type { ShipQuestion } from "~/schemas/planning/what-if";
import { AppError, type FieldError } from "~/utils/errors";
import type { PlanBook } from "./get-plan-book.server";
import { changeBookStructure } from "./what-if/change-book-structure";

type Changes = ShipQuestion["whatIf"];

/** What a plan is made of. */
export type TriedBook = Pick<PlanBook, "structure" | "supplies"> & {
  /** What the supplies were laid out from, row by row. */
  rows: Pick<PlanBook["rows"], "stock" | "orders">;
};

/**
 * The book as it would be with the changes; the book itself stays as it is. Throws 422 naming each change
 * that cannot be tried.
 */
export function tryWhatIf(book: PlanBook, changes: Changes): TriedBook {
  if (Object.values(changes).every((list) => list.length === 0)) return book;
  const { parts } = changes;
  const structure = changeBookStructure(
    book,
    { parts, structure: groupByParent(changes.structure) },
    "whatIf",
  );
  const stock = changeStock(structure, book.rows.stock, changes);
  const supply = changeSupply(structure, book.rows.orders, changes.supply);
  const problems = [stock, supply].flatMap((changed) => (changed.ok ? [] : changed.problems));
  if (!stock.ok || !supply.ok) throw refusal(problems.map(sayProblem));
  const supplies = compileSupplies(structure, stock.stock, supply.supply, book.day);
  return { structure, supplies, rows: { stock: stock.stock, orders: supply.supply } };
}

function groupByParent(lines: Changes["structure"]): { parent: string; lines: Changes["structure"] }[] {
  const byParent = new Map<string, { parent: string; lines: Changes["structure"] }>();
  for (const line of lines) {
    const key = partKey(line.parent);
    const group = byParent.get(key) ?? { parent: line.parent, lines: [] };
    group.lines.push(line);
    byParent.set(key, group);
  }
  return [...byParent.values()];
}

function refusal(errors: FieldError[]): AppError {
  return new AppError("invalid", errors[0].message, { errors });
}

function sayProblem(problem: WhatIfProblem): FieldError {
  const field = `whatIf.${problem.list}.${problem.at}`;
  switch (problem.code) {
    case "unknown-part":
      return {
        field,
        value: problem.partNumber,
        message: `There is no part ${problem.partNumber} in the book.`,
      };
    case "too-many-decimals":
      return {
        field,
        value: problem.quantity,
        message: `${problem.quantity} does not fit: the part is counted with ${problem.decimals} decimals.`,
      };
    case "less-than-nothing":
      return {
        field,
        value: problem.partNumber,
        message: `There are only ${problem.available} of ${problem.partNumber} to take away.`,
      };
    case "unknown-lot":
      return {
        field,
        value: problem.lot,
        message: `No usable stock of ${problem.partNumber} is of lot ${problem.lot}.`,
      };
    case "unknown-reference":
      return {
        field,
        value: problem.reference,
        message: `No open order has the number ${problem.reference}.`,
      };
  }
}
