import type { EffectsAnswer, OwnKitOrder, PlannedKitOrder, ShipLineState } from "~/schemas/planning/effects";
import { formatDate } from "~/utils/format/format-date";
import { formatNumber } from "~/utils/format/format-number";
import { cardinal, ordinal, sentenceCase } from "~/utils/format/number-words";

/** A run of the sentence: plain words, words that say what stops kits, or a figure. */
export interface EffectWord {
  text: string;
  stops?: boolean;
  figure?: boolean;
}

/** What an act does to the ship line as a whole; each has a shape of its own. */
export type EffectShape = "same" | "stops" | "helps" | "moves";

interface EffectSentence {
  shape: EffectShape;
  words: EffectWord[];
}

/** What an act would do to the ship line, in one or a few short sentences. */
export function effectWords(answer: EffectsAnswer): EffectSentence {
  const { before, after, becomeReady, stop, own, today } = answer;
  const told = [
    ...stopWords(stop),
    ...readyWords(becomeReady),
    ...own.slice(0, 1).flatMap((order) => ownWords(order, answer)),
    ...allByWords(before, after, today),
  ];
  const rest = told.length > 0 ? told : nextWords(before, after);
  return {
    shape: shapeOf(answer, rest.length > 0),
    words: [...leadWords(before, after, rest.length > 0), ...rest],
  };
}

function shapeOf({ before, after, becomeReady, stop }: EffectsAnswer, isTold: boolean): EffectShape {
  if (stop.length > 0) return "stops";
  if (becomeReady.length > 0 && after.ready >= before.ready) return "helps";
  return isTold || !sameCount(before, after) ? "moves" : "same";
}

function sameCount(before: ShipLineState, after: ShipLineState): boolean {
  return before.ready === after.ready && before.of === after.of;
}

function leadWords(before: ShipLineState, after: ShipLineState, isTold: boolean): EffectWord[] {
  if (after.of === 0) return [{ text: "No kit order would be open." }];
  const count = `${after.ready} of ${after.of} ready`;
  if (!sameCount(before, after)) {
    if (before.of === 0) return [{ text: `Ship line: ${count}.` }];
    const was = before.of === after.of ? String(before.ready) : `${before.ready} of ${before.of}`;
    return [{ text: `Ship line ${was} → ${count}.` }];
  }
  return [{ text: isTold ? `Ship line stays at ${count}.` : `Nothing changes on the ship line: ${count}.` }];
}

function stopWords(stop: readonly PlannedKitOrder[]): EffectWord[] {
  const [first, ...others] = stop;
  if (first === undefined) return [];
  const also = others.length === 0 ? "" : `, and ${cardinal(others.length)} more after it`;
  return [
    { text: " " },
    { text: first.kitOrder, figure: true, stops: true },
    { text: " would stop at ", stops: true },
    ...stopperWords(first).map((word) => ({ ...word, stops: true })),
    { text: `${also}.`, stops: true },
  ];
}

/** `HB-2041, 2 missing`, and how many other parts. */
function stopperWords({ stoppers }: Pick<PlannedKitOrder, "stoppers">): EffectWord[] {
  const [first, ...others] = stoppers;
  if (first === undefined) return [{ text: "a part that is missing" }];
  const also =
    others.length === 0
      ? ""
      : `, and ${cardinal(others.length)} other ${others.length === 1 ? "part" : "parts"}`;
  return [
    { text: first.partNumber, figure: true },
    { text: `, ${formatNumber(first.missing)} missing${also}` },
  ];
}

function readyWords(becomeReady: readonly string[]): EffectWord[] {
  const [first, ...others] = becomeReady;
  if (first === undefined) return [];
  const also = others.length === 0 ? "" : ` and ${cardinal(others.length)} more`;
  return [{ text: " " }, { text: first, figure: true }, { text: `${also} would become ready.` }];
}

/** The order of the form itself: its place, and whether it can go. What was said of it already is not said again. */
function ownWords({ kitOrder, place, planned }: OwnKitOrder, answer: EffectsAnswer): EffectWord[] {
  if (answer.stop[0]?.kitOrder === kitOrder || answer.becomeReady[0] === kitOrder) return [];
  const isBeyond = place > answer.after.of;
  const where = isBeyond ? `${ordinal(place)}, after the ship line` : ordinal(place);
  return [
    { text: " " },
    { text: kitOrder, figure: true },
    ...(planned === null
      ? [{ text: ` would be ${where}.` }]
      : goWords(isBeyond ? `${where},` : where, planned, answer.today)),
  ];
}

function goWords(where: string, planned: PlannedKitOrder, today: string): EffectWord[] {
  if (planned.isReady) return [{ text: ` would be ${where} and ready.` }];
  return [
    { text: ` would be ${where} and wait for ` },
    ...stopperWords(planned),
    { text: `, until ${formatDate(planned.readyOn, { today })}.` },
  ];
}

function allByWords(before: ShipLineState, after: ShipLineState, today: string): EffectWord[] {
  if (after.allBy === null || after.allBy === before.allBy || after.next === null) return [];
  const all = after.of === 1 ? "it" : after.of === 2 ? "both" : `all ${cardinal(after.of)}`;
  const instead = before.allBy === null ? "" : ` instead of ${formatDate(before.allBy, { today })}`;
  return [{ text: ` ${sentenceCase(all)} by ${formatDate(after.allBy, { today })}${instead}.` }];
}

/** The count stays, and yet another order or part is the first to wait. */
function nextWords(before: ShipLineState, after: ShipLineState): EffectWord[] {
  if (after.next === null || JSON.stringify(before.next) === JSON.stringify(after.next)) return [];
  return [
    { text: " " },
    { text: after.next.kitOrder, figure: true },
    { text: " would be the first to wait, for " },
    ...stopperWords(after.next),
    { text: "." },
  ];
}
