import type { Transaction } from "sequelize";
import { partKey } from "~/domain/planning/part-key";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type PartRow, partsKind } from "~/schemas/imports/parts";
import { checkChangedParts } from "~/services/imports/book/check-changed-parts.server";
import { readPartRecords } from "~/services/imports/book/read-part-records.server";
import { writeRows } from "~/services/imports/book/write-rows.server";
import { decideRecords, type RecordChange } from "~/services/imports/decide/decide-records";
import { checkParts } from "~/services/imports/files/check-parts";
import { checkStored, checkStoredFraction } from "~/services/imports/files/check-stored";
import { notePartNumber } from "~/services/imports/files/note-part-number";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

const columns = [
  "part_key",
  "part_number",
  "description",
  "sourcing",
  "unit",
  "decimals",
  "lead_time_days",
  "safety_stock",
  "lot_rule",
  "lot_minimum",
  "lot_multiple",
  "lot_maximum",
  "lot_days",
  "yield",
  "unit_cost",
  "mass_kg",
  "sold",
] as const;

function toColumns({ value: part }: RecordChange<PartRow>): unknown[] {
  return [
    partKey(part.partNumber),
    part.partNumber,
    part.description,
    part.sourcing,
    part.unit,
    part.decimals,
    part.leadTimeDays,
    part.safetyStock,
    part.lotRule,
    part.lotMinimum,
    part.lotMultiple,
    part.lotMaximum,
    part.lotDays,
    part.yield,
    part.unitCost,
    part.massKg,
    part.sold,
  ];
}

function checkStoredPart(row: ImportRow<PartRow>, part: PartRow): CsvProblem[] {
  return [
    checkStored(row, "safety_stock", part.safetyStock),
    checkStored(row, "lot_minimum", part.lotMinimum),
    checkStored(row, "lot_multiple", part.lotMultiple),
    checkStored(row, "lot_maximum", part.lotMaximum),
    checkStored(row, "unit_cost", part.unitCost),
    checkStored(row, "mass_kg", part.massKg),
    checkStoredFraction(row, "yield", part.yield),
  ].filter((problem) => problem !== null);
}

function write(changes: readonly RecordChange<PartRow>[], transaction: Transaction): Promise<void> {
  const update = columns.slice(1);
  return writeRows("part", columns, changes.map(toColumns), { transaction, update, versioned: true });
}

async function plan(rows: readonly ImportRow<PartRow>[], context: ImportContext): Promise<ImportPlan> {
  const { transaction } = context;
  const keyOf = (part: PartRow) => partKey(part.partNumber);
  const stored = await readPartRecords(transaction);
  const { decisions, changes } = decideRecords({
    rows,
    keyOf,
    keyColumn: "part_number",
    stored,
    columns: context.columns,
    check: (row, part) => [...checkStoredPart(row, part), ...checkParts([{ ...row, value: part }])],
  });
  const problems = await checkChangedParts(changes, stored, transaction);
  for (const decision of decisions) {
    const { partNumber } = decision.after as PartRow;
    for (const problem of problems.get(partKey(partNumber)) ?? []) {
      decision.problems.push({ ...decision.row.at(problem.column), expected: problem.expected });
    }
    decision.notes = notePartNumber(partNumber);
  }
  return { decisions, changes: changes.length > 0, write: () => write(changes, transaction) };
}

const job: ImportJob<PartRow> = {
  name: "parts",
  act: "import-parts",
  kind: partsKind,
  revisions: ["structure"],
  plan,
};

/** Imports parts; those that the file does not name stay as they are. Throws as `runImport` does. */
export function importParts(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
