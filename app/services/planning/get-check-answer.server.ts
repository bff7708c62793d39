import { presentShipCheck } from "~/domain/planning/answer/present-ship-check";
import { sortWorstFirst } from "~/domain/planning/answer/sort-worst-first";
import { sumCost } from "~/domain/planning/answer/sum-cost";
import { countReached } from "~/domain/planning/count-reached";
import { keepDrawnRungs } from "~/domain/planning/ladder-runs";
import { offeredOptions } from "~/domain/planning/netting/split-demand";
import { partKey } from "~/domain/planning/part-key";
import type { ShipPlan } from "~/domain/planning/plan-ship";
import type { ShipCheck } from "~/domain/planning/types";
import type {
  CheckKit,
  CheckPageAnswer,
  CheckPart,
  CheckQuestion,
  WithoutIfs,
} from "~/schemas/planning/check-answer";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { AppError } from "~/utils/errors";
import type { PlanBook } from "./get-plan-book.server";
import { getPlanBook } from "./get-plan-book.server";
import { hideCosts } from "./hide-costs";
import { planDemand } from "./plan-demand.server";
import { tryIfs } from "./what-if/try-ifs.server";

/** What Check is asked. */
export interface AskedCheck {
  /** What the address asks that cannot be: said instead of an answer. */
  problem?: string;
  kit?: string;
  quantity: number;
  by?: string;
  options: string[];
  ifs: string[];
}

/** Everything the page Check shows for a question; without a kit, the first kit of the book is asked for. */
export async function getCheckAnswer(asked: AskedCheck, person: CurrentPerson): Promise<CheckPageAnswer> {
  const book = await getPlanBook();
  const kits = presentKits(book);
  const seesCosts = mayDo(person.roles, "see-costs");
  const kit = asked.kit ?? mostWanted(book, kits);
  const question: CheckQuestion = {
    kit:
      kit === null ? null : (book.parts[book.structure.numberOf.get(partKey(kit)) ?? -1]?.partNumber ?? kit),
    quantity: asked.quantity,
    by: asked.by ?? null,
    options: asked.options,
    ifs: asked.ifs,
  };
  const empty = {
    question,
    answer: null,
    problem: null,
    parts: [],
    kits,
    stoppers: [],
    totalParts: 0,
    seesCosts,
    readyByDate: null,
    ifs: [],
    without: null,
  };
  if (question.kit === null) return empty;
  if (asked.problem !== undefined) return { ...empty, problem: asked.problem };
  const tried = tryIfs(book, asked.ifs, seesCosts);
  const planned = tryPlan(tried.book, question);
  if (typeof planned === "string") return { ...empty, ifs: tried.ifs, problem: planned };
  const answer = presentShipCheck(planned);
  const drawn = { ...answer, ladder: keepDrawnRungs(answer.ladder) };
  const parts = presentParts(book, planned, answer, seesCosts);
  return {
    ...empty,
    answer: seesCosts ? drawn : hideCosts(drawn),
    parts,
    stoppers: worstFirst(planned),
    readyByDate: readyByDate(answer),
    totalParts: countReached(planned.structure, planned.segments[0].part),
    ifs: tried.ifs,
    without: tried.book === book ? null : withoutIfs(book, question, seesCosts),
  };
}

/** The same question to the book as it is. */
function withoutIfs(book: PlanBook, question: CheckQuestion, seesCosts: boolean): WithoutIfs | null {
  const planned = tryPlan(book, question);
  if (typeof planned === "string") return null;
  const { demand, ladder } = presentShipCheck(planned);
  const { buildable, earliest } = demand[0];
  return { buildable, earliest, cost: seesCosts ? (ladder.at(-1)?.cost ?? null) : null };
}

function readyByDate({ demand, ladder }: ShipCheck): number | null {
  const due = demand[0].due;
  return due === null ? null : ladder.filter((rung) => rung.readyOn <= due).length;
}

/** The kit that most open orders ask for, else the first one there is. */
function mostWanted(book: PlanBook, kits: CheckKit[]): string | null {
  const counts = new Map<string, number>();
  for (const { partNumber } of book.kitOrders) counts.set(partNumber, (counts.get(partNumber) ?? 0) + 1);
  const [first] = [...kits].sort((a, b) => (counts.get(b.partNumber) ?? 0) - (counts.get(a.partNumber) ?? 0));
  return first?.partNumber ?? null;
}

function tryPlan(book: Pick<PlanBook, "structure" | "supplies">, question: CheckQuestion): ShipPlan | string {
  const { kit, quantity, by, options } = question;
  const demand = { partNumber: kit ?? "", quantity: String(quantity), due: by, options, serial: null };
  try {
    return planDemand(book, [demand], "strict");
  } catch (error) {
    if (error instanceof AppError) return error.message;
    throw error;
  }
}

function presentKits({ parts, structure, options }: PlanBook): CheckKit[] {
  return parts
    .flatMap((part, number) => (part.sold ? [{ part, number }] : []))
    .map(({ part, number }) => ({
      partNumber: part.partNumber,
      description: part.description,
      options: offeredOptions(structure, number).map((code) => ({
        code,
        description: options.get(code) ?? "",
      })),
    }))
    .sort((a, b) => (a.partNumber < b.partNumber ? -1 : 1));
}

/** The parts that the answer names. */
function presentParts(book: PlanBook, plan: ShipPlan, answer: ShipCheck, seesCosts: boolean): CheckPart[] {
  const named = new Set<string>();
  for (const { partNumber } of answer.shortages) named.add(partNumber);
  for (const { partNumber } of answer.criticalChain) named.add(partNumber);
  for (const { partNumber } of answer.warnings) named.add(partNumber);
  for (const { partNumber } of answer.demand) named.add(partNumber);
  return [...named].map((partNumber) => {
    const number = plan.structure.numberOf.get(partKey(partNumber)) as number;
    const part = plan.structure.parts[number];
    const stored = book.parts[book.structure.numberOf.get(partKey(partNumber)) as number];
    return {
      partNumber,
      description: stored.description,
      sourcing: part.sourcing,
      unit: part.unit,
      decimals: part.decimals,
      supplier: stored.offered,
      leadTimeDays: part.leadTimeDays,
      hasLaterOrders: plan.served.all.onOrder[number] > plan.served.coming.onOrder[number],
      unitCost: seesCosts ? part.unitCost : null,
      cost: seesCosts && part.unitCost !== null ? costOf(plan, number) : null,
    };
  });
}

function costOf(plan: ShipPlan, part: number): string {
  return sumCost(plan.structure, [{ part, short: plan.served.coming.net[part] }]);
}

/** Part numbers of all that stops kits. */
function worstFirst({ structure, served }: ShipPlan): string[] {
  const { stopsAt, ready, coming } = served;
  const stoppers = [...stopsAt.keys()].map((part) => ({
    part,
    readyOn: ready[part],
    short: coming.net[part],
  }));
  return sortWorstFirst(structure, stoppers).map(({ part }) => structure.parts[part].partNumber);
}
