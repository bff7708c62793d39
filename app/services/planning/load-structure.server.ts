import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { compileStructure } from "~/domain/planning/compile-structure";
import type { Structure } from "~/domain/planning/structure/structure";
import type { PlanLine, PlanPart } from "~/domain/planning/types";
import { trimDecimal } from "~/utils/format/trim-decimal";

/** A part as the pages name it; `offered` is the supplier to order it from first. */
export interface BookPart extends PlanPart {
  id: number;
  description: string;
  sold: boolean;
  offered: string | null;
}

/** The structure of the whole book, compiled, with what the pages say of its parts. */
export interface BookStructure {
  structure: Structure;
  /** Numbered like the structure's parts. */
  parts: BookPart[];
  /** Part id to number. */
  numberOfId: Map<number, number>;
  options: Map<string, string>;
}

interface PartRow extends Omit<BookPart, "sold"> {
  sold: number;
}

const PARTS = `
  SELECT part.id, part.part_number AS partNumber, part.description, part.sourcing, part.unit, part.decimals,
    part.lead_time_days AS leadTimeDays, part.yield, part.unit_cost AS unitCost, part.mass_kg AS massKg, part.sold,
    (SELECT supplier.name FROM offer JOIN supplier ON supplier.id = offer.supplier_id
      WHERE offer.part_id = part.id ORDER BY offer.preferred DESC, offer.from_quantity, offer.id LIMIT 1) AS offered
  FROM part ORDER BY part.part_key`;

const LINES = `
  SELECT parent.part_number AS parent, component.part_number AS component, line.quantity, line.scrap,
    line.option_code AS \`option\`, line.from_serial AS fromSerial, line.to_serial AS toSerial,
    line.from_date AS fromDate, line.to_date AS toDate
  FROM structure_line line
  JOIN part parent ON parent.id = line.parent_id
  JOIN part component ON component.id = line.component_id
  ORDER BY line.parent_id, line.position, line.id`;

/** Reads every part and line and compiles them. What is stored was checked when it came in, loops too. */
export async function loadStructure(transaction: Transaction): Promise<BookStructure> {
  const rows = await readRows<PartRow>(PARTS, {}, transaction);
  const lines = await readRows<PlanLine>(LINES, {}, transaction);
  const options = await readRows<{ code: string; description: string }>(
    "SELECT code, description FROM kit_option ORDER BY code",
    {},
    transaction,
  );
  const compiled = compileStructure(rows.map(presentRow), lines.map(trimLine));
  if (!compiled.ok) throw new Error(`The stored structure cannot be planned: ${compiled.problems[0].code}.`);
  const { structure } = compiled;
  const parts = structure.parts as BookPart[];
  return {
    structure,
    parts,
    numberOfId: new Map(parts.map((part, number) => [part.id, number])),
    options: new Map(options.map(({ code, description }) => [code, description])),
  };
}

function presentRow(row: PartRow): BookPart {
  return {
    ...row,
    sold: Boolean(row.sold),
    yield: trimDecimal(row.yield),
    unitCost: row.unitCost === null ? null : trimDecimal(row.unitCost),
    massKg: row.massKg === null ? null : trimDecimal(row.massKg),
  };
}

function trimLine(line: PlanLine): PlanLine {
  return {
    ...line,
    quantity: line.quantity === null ? null : trimDecimal(line.quantity),
    scrap: trimDecimal(line.scrap),
  };
}
