import { z } from "zod";
import type { ChainLink, DecimalString, IsoDate, Sourcing } from "~/domain/planning/types";
import { type CheckQuestion, checkQuestionSchema } from "./check-answer";

const blankIsAbsent = (value: unknown) => (value === "" || value === null ? undefined : value);
const optionalText = z.preprocess(blankIsAbsent, z.string().trim().max(120).optional());

/** What the address of a why adds to the question of Check. */
export const whyQuerySchema = checkQuestionSchema.extend({
  part: z
    .string({ error: "Say which part: part=PART-NUMBER." })
    .trim()
    .min(1, "Say which part: part=PART-NUMBER.")
    .max(120),
  /** A rung of the ladder: only so many of the kits. */
  kits: z.preprocess(
    blankIsAbsent,
    z.coerce
      .number({ error: "Give the rung as a whole number." })
      .int("Give the rung as a whole number.")
      .min(1, "The first rung is 1.")
      .max(1000, "The ladder has at most 1,000 rungs.")
      .optional(),
  ),
  /** With what is here today, or with what is on order as well. */
  with: z.preprocess(
    blankIsAbsent,
    z.enum(["stock", "orders"], { error: "with is stock or orders." }).default("stock"),
  ),
  /** Instead of a kit: the open kit orders, first to this one. */
  through: optionalText,
  /** The parts walked from, the first first. */
  via: z.array(z.string().trim().min(1).max(120)).max(100).default([]),
});

export type WhyQuery = z.output<typeof whyQuerySchema>;

/** A part as a why names it. */
export interface WhyPart {
  partNumber: string;
  description: string;
  unit: string;
  decimals: number;
  sourcing: Sourcing;
}

/** A line through which a parent asks for the part: `need` = `through` x `quantity` / (1 - `scrap`), rounded up. */
export interface WhyCause {
  parent: WhyPart;
  /** What of the parent is started, or passed on by a phantom. */
  through: DecimalString;
  /** Of the part for one of the parent. */
  quantity: DecimalString;
  scrap: DecimalString;
  option: string | null;
  need: DecimalString;
  isRounded: boolean;
}

/** Kits asked for: of a question, or of a kit order and its customer. */
export interface WhyDemand {
  kitOrder: string | null;
  customer: string | null;
  quantity: DecimalString;
  due: IsoDate | null;
}

/** A lot, or an open order, that covers some of the need. */
export interface WhyCover {
  /** Lot, or number of the order; null where stock has none. */
  name: string | null;
  used: DecimalString;
  /** Last day of the lot, or day of the order. */
  day: IsoDate | null;
  flag: "overdue" | "undated" | null;
}

/** What is there and does not count. */
export interface WhyOutOfReach {
  bin: string;
  lot: string;
  state: "held" | "staged" | "with-supplier" | "expired";
  quantity: DecimalString;
  expiresOn: IsoDate | null;
}

/** What the part, being started, asks of one of its components. */
export interface WhyComponent {
  component: WhyPart;
  need: DecimalString;
  /** Not covered in all of the plan; null where nothing lacks. */
  lacking: DecimalString | null;
}

/** Why a planned number of a part is what it is. Causes and demands add up to `gross`, and so do cover and `rest`. */
export interface WhyAnswer {
  question: CheckQuestion;
  through: string | null;
  kits: number;
  with: "stock" | "orders";
  today: IsoDate;
  part: WhyPart;
  gross: DecimalString;
  demands: WhyDemand[];
  causes: WhyCause[];
  fromStock: DecimalString;
  /** Row by row where lots must be told apart, since one of them expires; else null. */
  lots: WhyCover[] | null;
  onOrder: DecimalString;
  orders: WhyCover[];
  /** What neither covers: short or missing of a bought part, to be built of a made one, passed on by a phantom. */
  rest: DecimalString;
  restIs: "missing" | "short" | "built" | "passed on";
  /** Started for `rest`: more where some of it is lost to yield. */
  started: DecimalString;
  yield: DecimalString;
  components: WhyComponent[];
  outOfReach: WhyOutOfReach[];
  readyOn: IsoDate;
  /** From the part down to what everything waits for; empty where it differs from kit to kit. */
  chain: ChainLink[];
  leadTimeDays: number;
}
