import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import type { PlanDemand, ShipCheck } from "~/domain/planning/types";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { getPlanBook, type PlanBook } from "./get-plan-book.server";
import { hideCosts } from "./hide-costs";
import { planDemand } from "./plan-demand.server";

interface ShipCheckQuery {
  kit: string;
  quantity: string;
  by?: string;
  options: string[];
}

/**
 * Can so many kits ship from the firm's live stock? Asked as if no kit order existed: only what is staged
 * is out of reach. Costs are null for people who may not see them.
 */
export async function getShipCheck(query: ShipCheckQuery, person: CurrentPerson): Promise<ShipCheck> {
  const book = await getPlanBook();
  const answer = answerOnce(book, query);
  return mayDo(person.roles, "see-costs") ? answer : hideCosts(answer);
}

/** The last answers of a book; they are right as long as the book is. */
const answers = new WeakMap<PlanBook, Map<string, ShipCheck>>();
const MOST_KEPT = 20;

/** Several people look at the same question: it is worked out once for each book. */
function answerOnce(book: PlanBook, query: ShipCheckQuery): ShipCheck {
  const kept = answers.get(book) ?? new Map<string, ShipCheck>();
  answers.set(book, kept);
  const question = JSON.stringify([query.kit, query.quantity, query.by, query.options]);
  const answer = kept.get(question) ?? planAnswer(book, query);
  kept.delete(question);
  kept.set(question, answer);
  if (kept.size > MOST_KEPT) kept.delete(kept.keys().next().value as string);
  return answer;
}

function planAnswer(book: PlanBook, query: ShipCheckQuery): ShipCheck {
  const demand: PlanDemand = {
    partNumber: query.kit,
    quantity: query.quantity,
    due: query.by ?? null,
    options: query.options,
    serial: null,
  };
  return presentShipCheck(planDemand(book, [demand], "strict"));
}
