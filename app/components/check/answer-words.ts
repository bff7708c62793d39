import type { Rung } from "~/domain/planning/types";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { daysBetween, formatDate } from "~/utils/format/format-date";
import { formatMoney } from "~/utils/format/format-money";
import { formatQuantity } from "~/utils/format/format-quantity";
import { cardinal, ordinal, sentenceCase } from "~/utils/format/number-words";
import { unitSymbol } from "~/utils/format/unit-symbol";
import { partNoun, pluralOf } from "./part-noun";

/** A run of the answer: plain words, words that say what stops kits, or a part number. */
export interface Word {
  text: string;
  stops?: boolean;
  figure?: boolean;
}

/** The answer to "can they ship?" in one or a few short sentences. Empty where there is no answer. */
export function answerWords(page: CheckPageAnswer): Word[] {
  const demand = page.answer?.demand[0];
  if (page.answer === null || demand === undefined) return [];
  const asked = Number(demand.quantity);
  const made = page.answer.ladder.findLast((rung) => rung.stoppers.length === 0);
  const by = made === undefined ? "" : byDay(made.readyOn, page);
  if (demand.buildable === null || demand.buildable >= asked) {
    const limit = demand.buildable === null ? "Nothing limits this kit. " : "";
    const late = againstDue(demand.earliest, demand.due, page);
    return [{ text: `${limit}${sentenceCase(all(asked))} can be made from what is here${by}${late}.` }];
  }

  const stopped = demand.buildable + 1;
  const next = page.answer.ladder.find((rung) => rung.kits === stopped);
  const last = page.answer.ladder.at(-1);
  return [
    ...inTime(page, asked),
    { text: `${fromStock(demand.buildable, asked, by)} ` },
    ...(next ? waits(page, next, asked) : []),
    ...(last ? allBy(page, last, asked, next === last) : []),
  ];
}

/** With a date, how many make it comes first. */
function inTime(page: CheckPageAnswer, asked: number): Word[] {
  const due = page.answer?.demand[0]?.due ?? null;
  if (due === null || page.readyByDate === null || asked === 1) return [];
  const count = page.readyByDate === 0 ? "None" : sentenceCase(cardinal(page.readyByDate));
  return [{ text: `${count} of ${cardinal(asked)} can be ready by ${onDay(due, page)}. ` }];
}

function fromStock(buildable: number, asked: number, by: string): string {
  if (buildable > 0) return `${sentenceCase(cardinal(buildable))} can be made from what is here${by}.`;
  return asked === 1 ? "It cannot be made from what is here." : "None can be made from what is here.";
}

function all(count: number): string {
  if (count === 1) return "it";
  return count === 2 ? "both" : `all ${cardinal(count)}`;
}

function waits(page: CheckPageAnswer, rung: Rung, asked: number): Word[] {
  const names = new Map(rung.stoppers.map((stopper) => [stopper.partNumber, stopper]));
  const worst = page.stoppers.find((partNumber) => names.has(partNumber)) ?? rung.stoppers[0]?.partNumber;
  const stopper = worst === undefined ? undefined : names.get(worst);
  const who = asked === 1 ? "It" : `The ${ordinal(rung.kits)}`;
  if (worst === undefined || stopper === undefined) return [{ text: `${who} cannot go yet.`, stops: true }];
  const part = page.parts.find((one) => one.partNumber === worst);
  const isOne = unitSymbol(part?.unit ?? "EA") !== "" || Number(stopper.missing) === 1;
  const noun = part?.description ? partNoun(part.description) : "";
  const others = rung.stoppers.length - 1;
  const also = others === 0 ? "" : ` and ${cardinal(others)} other ${others === 1 ? "part" : "parts"}`;
  return [
    { text: `${who} waits for ${amount(stopper.missing, part)} `, stops: true },
    { text: worst, stops: true, figure: true },
    { text: noun === "" ? also : ` ${isOne ? noun : pluralOf(noun)}${also}`, stops: true },
    { text: ` until ${onDay(rung.readyOn, page)}` },
  ];
}

function amount(missing: string, part: CheckPageAnswer["parts"][number] | undefined): string {
  const unit = unitSymbol(part?.unit ?? "EA");
  const figure = formatQuantity(missing, part?.decimals ?? 0);
  if (unit !== "") return `${figure} ${unit} of`;
  return /^\d+$/.test(figure) ? cardinal(Number(figure)) : figure;
}

function allBy(page: CheckPageAnswer, last: Rung, asked: number, said: boolean): Word[] {
  const due = page.answer?.demand[0]?.due ?? null;
  const when = said ? "" : ` ${sentenceCase(all(asked))} by ${onDay(last.readyOn, page)}`;
  return [{ text: `${said ? "" : "."}${when}${againstDue(last.readyOn, due, page)}${price(last)}.` }];
}

function againstDue(readyOn: string, due: string | null, page: CheckPageAnswer): string {
  if (due === null) return "";
  const late = daysBetween(due, readyOn);
  if (late <= 0) return `, in time for ${onDay(due, page)}`;
  return `, ${cardinal(late)} ${late === 1 ? "day" : "days"} late for ${onDay(due, page)}`;
}

function price(rung: Rung): string {
  if (rung.cost === null) return "";
  if (/^0+(\.0+)?$/.test(rung.cost)) return ", with no more parts to buy";
  return `, for ${formatMoney(rung.cost)} more in parts`;
}

function byDay(iso: string, page: CheckPageAnswer): string {
  return iso === page.answer?.today ? ", today" : `, by ${onDay(iso, page)}`;
}

function onDay(iso: string, page: CheckPageAnswer): string {
  const today = page.answer?.today;
  return iso === today ? "today" : formatDate(iso, { today });
}
