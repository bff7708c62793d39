import type { Rung } from "~/domain/planning/types";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { daysBetween, formatDate } from "~/utils/format/format-date";
import { formatMoney } from "~/utils/format/format-money";
import { formatQuantity } from "~/utils/format/format-quantity";
import { cardinal, ordinal, sentenceCase } from "~/utils/format/number-words";
import { unitSymbol } from "~/utils/format/unit-symbol";
import { partNoun } from "./part-noun";

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
  if (demand.buildable === null) return [{ text: `Nothing limits this kit: ${all(asked)} can go now.` }];
  if (demand.buildable >= asked) return [{ text: `${sentenceCase(all(asked))} can go now.` }];

  const stopped = demand.buildable + 1;
  const next = page.answer.ladder.find((rung) => rung.kits === stopped);
  const last = page.answer.ladder.at(-1);
  return [
    { text: `${readyNow(demand.buildable, asked)} ` },
    ...(next ? waits(page, next, asked) : []),
    ...(last ? allBy(page, last, asked, next === last) : []),
  ];
}

function readyNow(buildable: number, asked: number): string {
  if (buildable > 0) return `${sentenceCase(cardinal(buildable))} can go now.`;
  return asked === 1 ? "It cannot go now." : "None can go now.";
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
  const others = rung.stoppers.length - 1;
  const also = others === 0 ? "" : ` and ${cardinal(others)} other ${others === 1 ? "part" : "parts"}`;
  return [
    { text: `${who} waits for ${amount(stopper.missing, part)} `, stops: true },
    { text: worst, stops: true, figure: true },
    { text: part?.description ? ` ${partNoun(part.description)}${also}` : also, stops: true },
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

function onDay(iso: string, page: CheckPageAnswer): string {
  const today = page.answer?.today;
  return iso === today ? "later today" : formatDate(iso, { today });
}
