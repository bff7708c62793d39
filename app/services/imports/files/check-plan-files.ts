import { compileStructure } from "~/domain/planning/compile-structure";
import { partKey } from "~/domain/planning/part-key";
import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanStock, PlanSupply } from "~/domain/planning/types";
import type { ImportKind } from "~/schemas/imports/import-kind";
import { type PartRow, partsKind } from "~/schemas/imports/parts";
import { type StockRow, stockKind } from "~/schemas/imports/stock";
import { type StructureRow, structureKind } from "~/schemas/imports/structure";
import { type SupplyRow, supplyKind } from "~/schemas/imports/supply";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { checkDecimals } from "./check-decimals";
import { checkParts } from "./check-parts";
import { type ImportRow, readImportRows } from "./read-import-rows";
import { structureProblem, unknownPart } from "./structure-problem";

/** A file as the person named it, and what is in it. */
export interface NamedFile {
  name: string;
  bytes: Uint8Array;
}

export interface PlanFiles {
  parts: NamedFile;
  structure: NamedFile;
  stock: NamedFile | null;
  supply: NamedFile | null;
}

export interface FileProblem extends CsvProblem {
  file: string;
}

export type PlanInput =
  | { ok: true; structure: Structure; stock: PlanStock[]; supply: PlanSupply[] }
  | { ok: false; problems: FileProblem[] };

interface Rows<Row> {
  rows: ImportRow<Row>[];
  /** Every row could be read. */
  whole: boolean;
}

/** Adds what is wrong with a file under its name. One by one: a spread of a hundred thousand overflows the stack. */
function addProblems(to: FileProblem[], file: NamedFile | null, problems: readonly CsvProblem[]): void {
  for (const problem of problems) to.push({ ...problem, file: file?.name ?? "" });
}

function readRows<Row>(file: NamedFile | null, kind: ImportKind<Row>, problems: FileProblem[]): Rows<Row> {
  if (file === null) return { rows: [], whole: true };
  const read = readImportRows(file.bytes, kind);
  if (!read.ok) {
    addProblems(problems, file, read.problems);
    return { rows: [], whole: false };
  }
  addProblems(
    problems,
    file,
    read.refused.flatMap((row) => row.problems),
  );
  return { rows: read.rows, whole: read.refused.length === 0 };
}

type Known = ReadonlyMap<string, PartRow>;

function checkQuantity(
  row: ImportRow<unknown>,
  column: string,
  number: string,
  quantity: string | null,
  known: Known,
) {
  const part = known.get(partKey(number));
  if (part === undefined) return unknownPart(row, column);
  return checkDecimals(row, "quantity", quantity, part);
}

function checkStructureRow(row: ImportRow<StructureRow>, known: Known): CsvProblem[] {
  const { parent, component, quantity } = row.value;
  const problems = known.has(partKey(parent)) ? [] : [unknownPart(row, "parent")];
  const problem = checkQuantity(row, "component", component, quantity, known);
  return problem ? [...problems, problem] : problems;
}

function checkPartQuantities(rows: readonly ImportRow<StockRow | SupplyRow>[], known: Known): CsvProblem[] {
  const found = rows.map((row) =>
    checkQuantity(row, "part_number", row.value.partNumber, row.value.quantity, known),
  );
  return found.filter((problem) => problem !== null);
}

/**
 * Reads and checks the files of a plan, each alone and then against each other. All that is wrong is told, file by
 * file; a parts list that cannot be read whole is mended first, so that its parts are not called unknown.
 */
export function checkPlanFiles(files: PlanFiles): PlanInput {
  const problems: FileProblem[] = [];
  const parts = readRows(files.parts, partsKind, problems);
  const structure = readRows(files.structure, structureKind, problems);
  const stock = readRows(files.stock, stockKind, problems);
  const supply = readRows(files.supply, supplyKind, problems);
  addProblems(problems, files.parts, checkParts(parts.rows));
  if (parts.whole) {
    const known = new Map(parts.rows.map(({ value }) => [partKey(value.partNumber), value]));
    const lines = structure.rows.flatMap((row) => checkStructureRow(row, known));
    addProblems(problems, files.structure, lines);
    addProblems(problems, files.stock, checkPartQuantities(stock.rows, known));
    addProblems(problems, files.supply, checkPartQuantities(supply.rows, known));
  }
  if (problems.length > 0) return { ok: false, problems };
  const compiled = compileStructure(
    parts.rows.map((row) => row.value),
    structure.rows.map((row) => row.value),
  );
  if (!compiled.ok) {
    const misplaced = compiled.problems.filter((problem) => problem.code !== "duplicate-part");
    const said = misplaced.map((problem) => structureProblem(problem, structure.rows[problem.line]));
    addProblems(problems, files.structure, said);
    return { ok: false, problems };
  }
  const usable = stock.rows.map((row) => row.value).filter((row) => row.state === "usable");
  return {
    ok: true,
    structure: compiled.structure,
    stock: usable,
    supply: supply.rows.map((row) => row.value),
  };
}
