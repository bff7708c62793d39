import { z } from "zod";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { importKindNames } from "~/schemas/imports/import-kind-name";
import { count } from "./values";

const error = z.object({
  line: count.optional(),
  column: z.string().optional(),
  value: z.string().optional(),
  unknownHeader: z.literal(true).optional(),
  message: z.string(),
});

const row = z.record(z.string(), z.unknown());

const line = z.object({
  line: count,
  result: z.enum(["new", "changed", "same", "refused"]),
  before: row.nullable(),
  after: row.nullable(),
  errors: z.array(error),
  notes: z.array(z.string()),
});

export const importFileAnswer = z.object({
  kind: z.enum(importKindNames),
  dryRun: z.boolean(),
  encoding: z.string(),
  delimiter: z.string(),
  rows: z.array(line),
  removed: z.array(row),
  counts: z.object({ new: count, changed: count, same: count, refused: count, removed: count }),
}) satisfies z.ZodType<ImportAnswer>;
