import { partsKind } from "~/schemas/imports/parts";
import { structureKind } from "~/schemas/imports/structure";
import { columnsOf } from "~/services/exports/columns-of";
import type { ExportTable } from "~/services/exports/export-table";
import { readWhole } from "~/services/exports/read-whole.server";

export const partsTable: ExportTable = {
  name: "parts",
  act: "look",
  columns: columnsOf(partsKind),
  costColumns: ["unit_cost"],
  read: readWhole(
    `SELECT part_number, sourcing, description, unit, decimals, lead_time_days, safety_stock, lot_rule, lot_minimum,
      lot_multiple, lot_maximum, lot_days, yield, unit_cost, mass_kg, sold
     FROM part ORDER BY part_key`,
    ["safety_stock", "lot_minimum", "lot_multiple", "lot_maximum", "yield", "unit_cost", "mass_kg"],
  ),
};

export const structureTable: ExportTable = {
  name: "structure",
  act: "look",
  columns: columnsOf(structureKind),
  read: readWhole(
    `SELECT parent.part_number AS parent, component.part_number AS component, quantity, scrap, find_number,
      option_code AS \`option\`, from_serial, to_serial, from_date, to_date
     FROM structure_line line JOIN part parent ON parent.id = line.parent_id
      JOIN part component ON component.id = line.component_id
     ORDER BY parent.part_key, line.position`,
    ["quantity", "scrap"],
  ),
};
