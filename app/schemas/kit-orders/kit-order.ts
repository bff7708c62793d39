import { z } from "zod";
import { parseSerial } from "~/domain/planning/netting/serial";

const HIGHEST_PRIORITY = 9999;

const text = (most: number, what: string) =>
  z
    .string({ error: `Write ${what} as text.` })
    .trim()
    .max(most, `At most ${most} characters.`);

const textOrNull = (most: number, what: string) =>
  text(most, what)
    .transform((value) => (value === "" ? null : value))
    .nullish()
    .transform((value) => value ?? null);

const NUMBER_RULE = "Use letters, digits, points, dashes and underscores, such as KO-0042.";
const SERIAL_RULE = "End the serial in digits, fifteen at most, such as 098 or SC-098.";
const PRIORITY_RULE = `Give a whole number from 1, which is served first, to 9,999.`;

/** An order of one kit, as the form and other programs send it. */
export const kitOrderSchema = z.object({
  /** Null: the next number is given. */
  number: textOrNull(60, "the number").refine(
    (value) => value === null || /^[\p{L}\p{N}][\p{L}\p{N}._-]*$/u.test(value),
    NUMBER_RULE,
  ),
  kit: text(60, "the kit").min(1, "Choose a kit."),
  options: z.array(text(60, "an option")).max(50, "At most 50 options.").default([]),
  serial: textOrNull(60, "the serial").refine(
    (value) => value === null || parseSerial(value) !== null,
    SERIAL_RULE,
  ),
  wantedOn: z
    .preprocess(
      (value) => (value === "" ? null : value),
      z.iso.date({ error: "Give the date as year-month-day, such as 2027-03-14." }).nullish(),
    )
    .transform((value) => value ?? null),
  customer: text(190, "the customer").default(""),
  priority: z.preprocess(
    (value) => (typeof value === "string" && /^\s*\d+\s*$/.test(value) ? Number(value) : value),
    z
      .number({ error: PRIORITY_RULE })
      .int(PRIORITY_RULE)
      .min(1, PRIORITY_RULE)
      .max(HIGHEST_PRIORITY, PRIORITY_RULE),
  ),
  note: text(1000, "the note").default(""),
});

/** A changed order also says which version of it the person had before them. */
export const changedKitOrderSchema = kitOrderSchema.extend({
  version: z.coerce.number({ error: "Load the order again." }).int("Load the order again."),
});

export type KitOrderInput = z.output<typeof kitOrderSchema>;

export type ChangedKitOrderInput = z.output<typeof changedKitOrderSchema>;
