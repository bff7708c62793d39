import type { Transaction } from "sequelize";
import { compileStructure } from "~/domain/planning/compile-structure";
import { partKey } from "~/domain/planning/part-key";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import type { PartRow } from "~/schemas/imports/parts";
import { type StructureRow, structureKind } from "~/schemas/imports/structure";
import { readBookLines } from "~/services/imports/book/read-book-lines.server";
import { readPartRecords } from "~/services/imports/book/read-part-records.server";
import { runStatement } from "~/services/imports/book/run-statement.server";
import { writeRows } from "~/services/imports/book/write-rows.server";
import type { StoredRecord } from "~/services/imports/decide/decide-records";
import { matchLines } from "~/services/imports/decide/match-lines";
import { checkDecimals } from "~/services/imports/files/check-decimals";
import { checkStored, checkStoredFraction } from "~/services/imports/files/check-stored";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import { structureProblem, unknownPart } from "~/services/imports/files/structure-problem";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

type Parts = ReadonlyMap<string, StoredRecord<PartRow>>;

const columns = [
  "parent_id",
  "component_id",
  "position",
  "quantity",
  "scrap",
  "find_number",
  "option_code",
  "from_serial",
  "to_serial",
  "from_date",
  "to_date",
] as const;

function checkRow(row: ImportRow<StructureRow>, parts: Parts): CsvProblem[] {
  const { parent, component, quantity, scrap } = row.value;
  const part = parts.get(partKey(component));
  return [
    parts.has(partKey(parent)) ? null : unknownPart(row, "parent"),
    part ? checkDecimals(row, "quantity", quantity, part.value) : unknownPart(row, "component"),
    checkStored(row, "quantity", quantity),
    checkStoredFraction(row, "scrap", scrap),
  ].filter((problem) => problem !== null);
}

/** Compiles the whole book as it would be; what is wrong is said of a row of the file, by its index. */
function checkBook(rows: readonly ImportRow<StructureRow>[], kept: readonly StructureRow[], parts: Parts) {
  const lines = [...rows.map((row) => row.value), ...kept];
  const compiled = compileStructure(
    [...parts.values()].map((part) => part.value),
    lines,
  );
  if (compiled.ok) return [];
  return compiled.problems.flatMap((problem) => {
    if (problem.code === "duplicate-part") return [];
    if (problem.line < rows.length)
      return [{ index: problem.line, problem: structureProblem(problem, rows[problem.line]) }];
    const named = new Set(
      problem.code === "loop" ? problem.loop.map(partKey) : [partKey(lines[problem.line].parent)],
    );
    const cause = rows.findIndex(({ value }) => named.has(partKey(value.component)));
    const index = Math.max(cause, 0);
    return [{ index, problem: structureProblem(problem, rows[index]) }];
  });
}

async function write(rows: readonly StructureRow[], parts: Parts, transaction: Transaction): Promise<void> {
  const idOf = (partNumber: string) => parts.get(partKey(partNumber))?.id as number;
  const parents = [...new Set(rows.map((row) => idOf(row.parent)))];
  await runStatement("DELETE FROM structure_line WHERE parent_id IN (:parents)", { parents }, transaction);
  const options = [...new Set(rows.flatMap((row) => row.option ?? []))].map((code) => [code]);
  await writeRows("kit_option", ["code"], options, { transaction, update: ["code"] });
  const positions = new Map<number, number>();
  const values = rows.map((row) => {
    const parent = idOf(row.parent);
    const position = (positions.get(parent) ?? 0) + 1;
    positions.set(parent, position);
    const { quantity, scrap, findNumber, option, fromSerial, toSerial, fromDate, toDate } = row;
    const component = idOf(row.component);
    return [
      parent,
      component,
      position,
      quantity,
      scrap,
      findNumber,
      option,
      fromSerial,
      toSerial,
      fromDate,
      toDate,
    ];
  });
  await writeRows("structure_line", columns, values, { transaction });
}

/** Part numbers as the book shows them, so that the same line in other letters is the same line. */
function spell(row: ImportRow<StructureRow>, parts: Parts): ImportRow<StructureRow> {
  const shown = (partNumber: string) => parts.get(partKey(partNumber))?.value.partNumber ?? partNumber;
  const { parent, component } = row.value;
  return { ...row, value: { ...row.value, parent: shown(parent), component: shown(component) } };
}

async function plan(
  typed: readonly ImportRow<StructureRow>[],
  { transaction }: ImportContext,
): Promise<ImportPlan> {
  const parts = await readPartRecords(transaction);
  const rows = typed.map((row) => spell(row, parts));
  const book = await readBookLines(transaction);
  const named = new Set(rows.map((row) => partKey(row.value.parent)));
  const replaced = book.filter((line) => named.has(partKey(line.parent)));
  const kept = book.filter((line) => !named.has(partKey(line.parent)));
  const { before, removed, changed } = matchLines(
    rows.map((row) => row.value),
    replaced,
  );
  const decisions = rows.map((row, at) => ({
    row,
    before: before[at],
    after: row.value,
    problems: checkRow(row, parts),
  }));
  if (decisions.every((decision) => decision.problems.length === 0)) {
    for (const { index, problem } of checkBook(rows, kept, parts)) decisions[index].problems.push(problem);
  }
  const toWrite = rows.map((row) => row.value).filter((line) => changed.has(partKey(line.parent)));
  return { decisions, removed, changes: changed.size > 0, write: () => write(toWrite, parts, transaction) };
}

const job: ImportJob<StructureRow> = {
  name: "structure",
  act: "import-parts",
  kind: structureKind,
  revisions: ["structure"],
  plan,
};

/** Imports structure lines: all lines of each parent that the file names are replaced. Throws as `runImport` does. */
export function importStructure(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
