import type { CheckIf } from "~/schemas/planning/check-answer";
import { type If, parseIf } from "~/schemas/planning/if-text";
import { type ShipQuestion, whatIfSchema } from "~/schemas/planning/what-if";
import type { PlanBook } from "~/services/planning/get-plan-book.server";
import { type TriedBook, tryWhatIf } from "~/services/planning/try-what-if.server";
import { AppError } from "~/utils/errors";

interface Tried {
  book: TriedBook;
  /** Each change with what keeps it from being tried, if anything does. */
  ifs: CheckIf[];
}

/** The changes of an address as the body of a ship check names them; several on one part become one row. */
function bodyOf(changes: readonly If[]): Record<string, unknown[]> {
  const body = { stock: [], hold: [], supply: [], parts: [] as Record<string, string>[] } as Record<
    string,
    unknown[]
  >;
  const rows = new Map<string, Record<string, string>>();
  const changePart = (partNumber: string, cells: Record<string, string>) => {
    rows.set(partNumber, { part_number: partNumber, ...rows.get(partNumber), ...cells });
  };
  for (const change of changes) {
    if (change.kind === "stock") body.stock.push({ partNumber: change.partNumber, change: change.change });
    if (change.kind === "hold") body.hold.push({ partNumber: change.partNumber, lot: change.lot || null });
    if (change.kind === "order") body.supply.push({ reference: change.reference, due: change.due });
    if (change.kind === "arrival") {
      body.supply.push({ partNumber: change.partNumber, quantity: change.quantity, due: change.due });
    }
    if (change.kind === "lead") changePart(change.partNumber, { lead_time_days: change.days });
    if (change.kind === "cost") changePart(change.partNumber, { unit_cost: change.cost });
  }
  return { ...body, parts: [...rows.values()] };
}

function readAll(changes: readonly If[]): ShipQuestion["whatIf"] {
  const parsed = whatIfSchema.safeParse(bodyOf(changes));
  if (parsed.success) return parsed.data;
  throw new AppError("invalid", `It needs ${parsed.error.issues[0].message}.`);
}

function problemOf(work: () => unknown): string | null {
  try {
    work();
    return null;
  } catch (error) {
    if (error instanceof AppError) return error.message;
    throw error;
  }
}

/**
 * The book with the changes that an address asks for. One that cannot be tried is left out and says why; the others
 * are tried all the same. Costs are changed only for people who may see them.
 */
export function tryIfs(book: PlanBook, texts: readonly string[], seesCosts: boolean): Tried {
  const kept: If[] = [];
  const ifs = texts.map((text): CheckIf => {
    const change = parseIf(text);
    if (change === null)
      return { text, problem: "It is no change that can be tried. Take it away and enter it again." };
    if (change.kind === "cost" && !seesCosts) {
      return { text, problem: "Prices are for people who may see costs." };
    }
    const problem = problemOf(() => tryWhatIf(book, readAll([...kept, change])));
    if (problem === null) kept.push(change);
    return { text, problem };
  });
  return { book: kept.length === 0 ? book : tryWhatIf(book, readAll(kept)), ifs };
}
