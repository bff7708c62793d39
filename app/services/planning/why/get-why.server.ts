import { isoDate } from "~/domain/planning/dates/day-number";
import { explainDate } from "~/domain/planning/explain-date";
import { partKey } from "~/domain/planning/part-key";
import { PHANTOM } from "~/domain/planning/structure/structure";
import type { PlanDemand } from "~/domain/planning/types";
import { formatSteps } from "~/domain/quantity/format-steps";
import type { WhyAnswer, WhyDemand, WhyPart, WhyQuery } from "~/schemas/planning/why";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { getPlanBook, type PlanBook } from "~/services/planning/get-plan-book.server";
import { openOrderDemands } from "~/services/planning/open-order-demands";
import { planDemand } from "~/services/planning/plan-demand.server";
import type { TriedBook } from "~/services/planning/try-what-if.server";
import { tryIfs } from "~/services/planning/what-if/try-ifs.server";
import { AppError } from "~/utils/errors";
import { findOutOfReach } from "./find-out-of-reach.server";
import { presentCover } from "./present-cover";
import { figureOf, type Pass, presentCauses, presentComponents } from "./present-need";

/**
 * Why a planned number of a part is what it is: what asks for it, what covers it, what is left, what does not count,
 * and what sets its date.
 * @throws AppError "not-found" for a part, kit or kit order that is not there; "invalid" for options that do not fit
 */
export async function getWhy(query: WhyQuery, person: CurrentPerson): Promise<WhyAnswer> {
  const book = await getPlanBook();
  const { book: tried } = tryIfs(book, query.ifs, mayDo(person.roles, "see-costs"));
  const { structure } = tried;
  const part = structure.numberOf.get(partKey(query.part));
  if (part === undefined) throw notThere(`There is no part ${query.part} in the book.`);
  const { demand, orders } = demandsOf(book, query);
  const plan = planDemand(tried, demand, "strict");
  const { served } = plan;
  const lane = query.with === "stock" ? "now" : "coming";
  const show = (number: number) => showPart(book, tried, number);
  const pass: Pass = { plan, state: served[lane], base: served.before[lane], show };
  const shown = show(part);
  const write = (figure: Parameters<typeof figureOf>[1]) =>
    formatSteps(figureOf(pass, figure, part), shown.decimals);
  const { causes } = presentCauses(pass, part);
  return {
    question: {
      kit: query.through ? null : demand[0].partNumber,
      quantity: query.quantity,
      by: query.by ?? null,
      options: query.options,
      ifs: query.ifs,
    },
    through: query.through ?? null,
    kits: query.through ? demand.length : Number(demand[0].quantity),
    with: query.with,
    today: book.day,
    part: shown,
    gross: write("gross"),
    demands: demand.flatMap((one, place) =>
      partKey(one.partNumber) === partKey(shown.partNumber) ? [presentDemand(one, orders?.[place])] : [],
    ),
    causes,
    fromStock: write("fromStock"),
    onOrder: lane === "now" ? formatSteps(0, shown.decimals) : write("onOrder"),
    ...presentCover(pass, tried, { part, with: query.with }),
    rest: write("net"),
    restIs: restWords(tried, part, query.with),
    started: write("start"),
    yield: structure.parts[part].yield,
    components: presentComponents(pass, part),
    outOfReach: await findOutOfReach(partKey(shown.partNumber), query.by ?? book.day),
    readyOn: isoDate(served.ready[part]),
    chain: explainDate(plan, part),
    leadTimeDays: structure.leadTime[part],
  };
}

function notThere(message: string): AppError {
  return new AppError("not-found", message);
}

interface Demands {
  demand: PlanDemand[];
  /** The kit orders behind the demands, one each. */
  orders: PlanBook["kitOrders"] | null;
}

function demandsOf(book: PlanBook, query: WhyQuery): Demands {
  if (query.through === undefined) {
    if (query.kit === undefined) throw new AppError("invalid", "Say which kit: kit=PART-NUMBER.");
    const quantity = String(query.kits ?? query.quantity);
    const { kit, by = null, options } = query;
    return { demand: [{ partNumber: kit, quantity, due: by, options, serial: null }], orders: null };
  }
  const place = book.kitOrders.findIndex(({ number }) => number === query.through);
  if (place < 0) throw notThere(`No open kit order has the number ${query.through}.`);
  return { demand: openOrderDemands(book, place + 1), orders: book.kitOrders.slice(0, place + 1) };
}

function presentDemand(demand: PlanDemand, order: PlanBook["kitOrders"][number] | undefined): WhyDemand {
  const { quantity, due } = demand;
  return { kitOrder: order?.number ?? null, customer: order?.customer || null, quantity, due };
}

/** Part numbers are the book's; a part that a what-if adds has no description yet. */
function showPart(book: PlanBook, { structure }: TriedBook, number: number): WhyPart {
  const { partNumber, unit, decimals, sourcing } = structure.parts[number];
  const stored = book.structure.numberOf.get(partKey(partNumber));
  const description = stored === undefined ? "" : book.parts[stored].description;
  return { partNumber, description, unit, decimals, sourcing };
}

function restWords({ structure }: TriedBook, part: number, lane: WhyQuery["with"]): WhyAnswer["restIs"] {
  if (structure.leaf[part] === 1) return lane === "stock" ? "missing" : "short";
  return structure.sourcing[part] === PHANTOM ? "passed on" : "built";
}
