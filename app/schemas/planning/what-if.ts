import { z } from "zod";
import { emptyAs } from "~/schemas/fields/empty-as";
import { isoDate } from "~/schemas/fields/iso-date";
import { partNumber } from "~/schemas/fields/part-number";
import { positiveQuantity } from "~/schemas/fields/quantity";
import { code } from "~/schemas/fields/text";
import { partsKind } from "~/schemas/imports/parts";
import { structureKind } from "~/schemas/imports/structure";

const MOST_ENTRIES = 500;

export const signedQuantity = z
  .string()
  .trim()
  .regex(/^[+-]?\d{1,24}(\.\d{1,6})?$/, "a quantity with its sign, such as +2 or -0.350");
export const optionalDate = z.union([isoDate, z.null()]).default(null);
const wholeKits = z
  .union([z.string(), z.number().int().transform(String)])
  .pipe(z.string().regex(/^0*[1-9]\d{0,11}$/, 'a whole number of kits above 0, such as "10"'))
  .transform((text) => String(Number(text)));

/** Cells as the CSV holds them; a number is taken as it is written, nothing and null as an empty cell. */
export const cells = z.record(
  z.string(),
  z.union([z.string(), z.number().transform(String), z.null().transform(() => "")]),
);

/** A row of a CSV kind in JSON: its columns as keys, those left out with their defaults. */
export function csvRow<Row>(kind: {
  columns: { required: readonly string[]; optional: readonly string[] };
  row: z.ZodType<Row>;
}) {
  const { required, optional } = kind.columns;
  const known = new Set([...required, ...optional]);
  return cells
    .superRefine((row, ctx) => {
      for (const name of Object.keys(row)) {
        if (!known.has(name))
          ctx.addIssue({ code: "custom", path: [name], message: `one of ${[...known].join(", ")}` });
      }
    })
    .transform((row) => Object.fromEntries([...known].map((name) => [name, row[name] ?? ""])))
    .pipe(kind.row as z.ZodType<Row, { [column: string]: string }>);
}

/** A part's row of which some columns may be left out: `given` names those that are there. */
export const partChange = cells.transform((row, ctx) => {
  const filled = "sourcing" in row ? row : { ...row, sourcing: "buy" };
  const parsed = csvRow(partsKind).safeParse(filled);
  if (parsed.success) return { given: new Set(Object.keys(row)), part: parsed.data };
  for (const { path, message } of parsed.error.issues) {
    ctx.addIssue({ code: "custom", path: [...path], message, input: row });
  }
  return z.NEVER;
});

const supplyChange = z.union([
  z.strictObject({ reference: code("an order's number"), due: optionalDate }),
  z.strictObject({ partNumber, quantity: positiveQuantity, due: optionalDate }),
]);

/** Changes that are tried on the book and never stored. */
export const whatIfSchema = z.strictObject({
  stock: z
    .array(z.strictObject({ partNumber, change: signedQuantity }))
    .max(MOST_ENTRIES)
    .default([]),
  hold: z
    .array(z.strictObject({ partNumber, lot: z.union([z.string().trim().max(120), z.null()]).default(null) }))
    .max(MOST_ENTRIES)
    .default([]),
  supply: z.array(supplyChange).max(MOST_ENTRIES).default([]),
  parts: z.array(partChange).max(MOST_ENTRIES).default([]),
  structure: z
    .array(csvRow(structureKind))
    .max(MOST_ENTRIES * 4)
    .default([]),
});

const demand = z.strictObject({
  partNumber,
  quantity: wholeKits,
  due: optionalDate,
  options: z
    .array(emptyAs(code("an option code"), ""))
    .max(100)
    .default([]),
  serial: z.union([z.string().trim().min(1).max(60), z.null()]).default(null),
});

/** The body of `POST /api/ship-check`. */
export const shipQuestionSchema = z.strictObject({
  demand: z.array(demand).min(1, "Ask for at least one kit.").max(MOST_ENTRIES),
  after: z.enum(["nothing", "open-orders"]).default("nothing"),
  sharing: z.enum(["strict", "release"]).default("strict"),
  whatIf: whatIfSchema.default({ stock: [], hold: [], supply: [], parts: [], structure: [] }),
});

export type ShipQuestion = z.output<typeof shipQuestionSchema>;
