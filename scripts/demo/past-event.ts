import type { BookPart } from "./book";
import type { StockRow } from "./fill-shelves";
import { goodsInBins } from "./lay-out-bins";
import type { Random } from "./random";

export type MovementKind = "receive" | "return" | "issue" | "scrap" | "move" | "hold" | "release" | "adjust";

/** A bin and a state in it. */
export type Place = [bin: string, state: string];

/** A movement of one part and lot; `day` counts from the start of the history, `hour` orders within it. */
export interface PastEvent {
  day: number;
  hour: number;
  kind: MovementKind;
  /** In whole steps of the part. */
  steps: number;
  reason: string;
  /** Not yet a number: see `numberReferences`. */
  reference: string;
  from: Place | null;
  to: Place | null;
}

/** What is known of one balance while its past is made up. */
export interface Recalled {
  part: BookPart;
  row: StockRow;
  /** Steps that one kit takes. */
  uses: { s2: number; s4: number };
  /** The part whose shop order takes this one. */
  job: string;
  /** Code of the usual supplier; empty for what is made here. */
  source: string;
  chances: Random;
}

const firstDate = Date.UTC(2024, 11, 30);

export const dayOf = (date: string) => Math.round((Date.parse(date) - firstDate) / 86_400_000);

/** Moment of an hour of a day of the history, in milliseconds. */
export const timeOf = (day: number, hour: number) => firstDate + day * 86_400_000 + hour * 3_600_000;

/** The last whole day of the history; a hundred weeks have 700. */
export const lastDay = 699;

const FIRST_OF_YEAR: Record<string, number> = { "25": 2, "26": 367 };

/** The day on which a lot came in: lots are numbered through the year. */
export function lotDay(lot: string): number {
  const [year, number] = lot.split("-");
  return workday((FIRST_OF_YEAR[year] ?? 0) + Math.floor(Number(number) * 0.67));
}

/** The Friday before, for a weekend. */
export const workday = (day: number) => Math.max(0, day - Math.max(0, (day % 7) - 4));

/** The shop order on which a part is made or taken; one a part and week. */
export const jobReference = (day: number, part: string) =>
  `SO/${String(Math.floor(day / 7)).padStart(3, "0")}/${part}`;

/** What brought the part in: a purchase order a supplier and week, or its own shop order. */
export function sourceReference({ part, source, job }: Recalled, day: number): string {
  if (part.sourcing === "buy") return `PO/${String(Math.floor(day / 7)).padStart(3, "0")}/${source}`;
  return jobReference(day, part.leadTimeDays > 2 ? part.partNumber : job);
}

export const goodsIn = (day: number): Place => [goodsInBins[day % goodsInBins.length], "usable"];
