import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import type { PlanDemand, ShipCheck } from "~/domain/planning/types";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { getPlanBook } from "./get-plan-book.server";
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
  const demand: PlanDemand = {
    partNumber: query.kit,
    quantity: query.quantity,
    due: query.by ?? null,
    options: query.options,
    serial: null,
  };
  const answer = presentShipCheck(planDemand(book, [demand], "strict"));
  return mayDo(person.roles, "see-costs") ? answer : hideCosts(answer);
}
