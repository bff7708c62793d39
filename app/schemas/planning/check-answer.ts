import { z } from "zod";
import type { DecimalString, IsoDate, ShipCheck, Sourcing } from "~/domain/planning/types";

/** Most kits one question may ask for; the ladder has a rung for each. */
const MOST_KITS = 1000;
const MOST_IFS = 30;

const blankIsAbsent = (value: unknown) => (value === "" || value === null ? undefined : value);

/** `?kit=S2&quantity=10&by=2027-03-01&options=A,B`: what Check is asked in the address. */
export const checkQuestionSchema = z.object({
  kit: z.preprocess(blankIsAbsent, z.string().trim().max(64).optional()),
  quantity: z.preprocess(
    blankIsAbsent,
    z.coerce
      .number({ error: "Give a whole number of kits, such as 10." })
      .int("Give a whole number of kits, such as 10.")
      .min(1, "Ask for at least one kit.")
      .max(MOST_KITS, "Ask for at most 1,000 kits at a time.")
      .default(10),
  ),
  by: z.preprocess(
    blankIsAbsent,
    z.iso.date({ error: "Give the date as year-month-day, such as 2027-03-14." }).optional(),
  ),
  options: z.preprocess(blankIsAbsent, z.string().max(400).optional()).transform((text) =>
    (text ?? "")
      .split(",")
      .map((code) => code.trim())
      .filter((code) => code !== ""),
  ),
  ifs: z
    .array(z.string().max(300, "A change to try is at most 300 characters long."))
    .max(MOST_IFS, `Try at most ${MOST_IFS} changes at a time.`)
    .default([]),
});

/** What Check asks, with its gaps filled: null `kit` only where the book has no kit at all. */
export interface CheckQuestion {
  kit: string | null;
  quantity: number;
  by: IsoDate | null;
  options: string[];
  /** Changes to try, as `if-text` writes them. */
  ifs: string[];
}

/** A change to try; with a problem it is left out of the answer. */
export interface CheckIf {
  text: string;
  problem: string | null;
}

/** The answer as it is without the changes that are tried. */
export interface WithoutIfs {
  buildable: number | null;
  earliest: IsoDate;
  /** Of all kits asked for; null for people who may not see costs. */
  cost: DecimalString | null;
}

/** A part that the answer speaks of. Costs are null where unknown, and for people who may not see them. */
export interface CheckPart {
  partNumber: string;
  description: string;
  sourcing: Sourcing;
  unit: string;
  decimals: number;
  supplier: string | null;
  leadTimeDays: number;
  unitCost: DecimalString | null;
  /** There is more on order that comes after the date asked for. */
  hasLaterOrders: boolean;
  /** `short` x unit cost for the whole question, two decimals. */
  cost: DecimalString | null;
}

/** A kit that can be asked for, with the options its lines offer. */
export interface CheckKit {
  partNumber: string;
  description: string;
  options: { code: string; description: string }[];
}

/** Everything the page Check shows. Served by the page's loader and by `GET /api/check-answer`. */
export interface CheckPageAnswer {
  question: CheckQuestion;
  /** Null when there is nothing to answer: no kits yet, or `problem` says why. Its ladder holds the rungs that are drawn. */
  answer: ShipCheck | null;
  /** A sentence: which kit or option is not there, and what to do. */
  problem: string | null;
  parts: CheckPart[];
  kits: CheckKit[];
  /** Part numbers of the parts that stop kits, worst first. */
  stoppers: string[];
  /** Different parts in the kit's structure. */
  totalParts: number;
  seesCosts: boolean;
  /** How many of the kits can be ready by the date asked for; null without a date. */
  readyByDate: number | null;
  ifs: CheckIf[];
  /** Null where nothing is tried. */
  without: WithoutIfs | null;
}
