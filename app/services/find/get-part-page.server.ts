import { dayNumber } from "~/domain/planning/dates/day-number";
import { splitDemand } from "~/domain/planning/netting/split-demand";
import { partKey } from "~/domain/planning/part-key";
import { rollUpCost } from "~/domain/planning/roll-up-cost";
import { type MassRollUp, rollUpMass } from "~/domain/planning/roll-up-mass";
import type { PartPage } from "~/schemas/find/part-page";
import { getComponents } from "~/services/parts/get-components.server";
import { getOffers } from "~/services/parts/get-offers.server";
import { getPart } from "~/services/parts/get-part.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { getPlanBook, type PlanBook } from "~/services/planning/get-plan-book.server";
import { kitsShown } from "~/services/planning/ship-line/kits-shown.server";
import { presentKitOrders } from "~/services/planning/ship-line/present-kit-orders";

/** Everything the page of a part shows. Throws 404 where there is no such part. */
export async function getPartPage(partNumber: string, person: CurrentPerson): Promise<PartPage> {
  const key = partKey(partNumber);
  const seesCosts = mayDo(person.roles, "see-costs");
  const part = await getPart(partNumber, person);
  const [components, offers, book, shown] = await Promise.all([
    getComponents(key),
    getOffers({ part: key }, seesCosts),
    getPlanBook(),
    kitsShown(),
  ]);
  const orders = presentKitOrders(book, shown);
  return {
    part,
    components,
    offers,
    rolledUpCost: seesCosts ? rollUpCost(book.structure, part.partNumber, [], book.day) : null,
    rolledUpMass: massOf(book, part.partNumber),
    stops: orders.flatMap(({ kitOrder, stoppers }) =>
      stoppers
        .filter((stopper) => partKey(stopper.partNumber) === key)
        .map(({ missing }) => ({ kitOrder, missing })),
    ),
    ordersAsked: orders.length,
    seesCosts,
    today: book.day,
  };
}

/** What one weighs without options and serial, by the lines that count today. */
function massOf({ structure, day }: PlanBook, partNumber: string): MassRollUp | null {
  const demand = { partNumber, quantity: "1", due: null, options: [], serial: null };
  const result = splitDemand(structure, demand, 0, dayNumber(day));
  return result.ok ? rollUpMass(structure, partNumber, result.split.segments[0].admits) : null;
}
