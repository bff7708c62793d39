import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import type { ShipCheck } from "~/domain/planning/types";
import type { ShipQuestion } from "~/schemas/planning/what-if";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { getPlanBook } from "./get-plan-book.server";
import { hideCosts } from "./hide-costs";
import { openOrderDemands } from "./open-order-demands";
import { planDemand } from "./plan-demand.server";
import { tryWhatIf } from "./try-what-if.server";

/**
 * Answers a ship check over the live book with changes tried on it, as if no kit order existed or after
 * the open ones. Stores nothing. Costs are null for people who may not see them.
 */
export async function answerShipQuestion(question: ShipQuestion, person: CurrentPerson): Promise<ShipCheck> {
  const book = await getPlanBook();
  const first = question.after === "open-orders" ? openOrderDemands(book) : [];
  const plan = planDemand(tryWhatIf(book, question.whatIf), question.demand, question.sharing, first);
  const answer = presentShipCheck(plan);
  return mayDo(person.roles, "see-costs") ? answer : hideCosts(answer);
}
