import type { ExportKindName } from "~/schemas/exports/export-kind-name";
import type { ExportTable } from "./export-table";
import { kitOrdersTable, offersTable, suppliersTable, supplyTable } from "./tables/order-tables.server";
import { partsTable, structureTable } from "./tables/part-tables.server";
import { binsTable, movementsTable, stockTable } from "./tables/stock-tables.server";

/** Every table that leaves the book. */
export const EXPORT_TABLES: Readonly<Record<ExportKindName, ExportTable>> = {
  suppliers: suppliersTable,
  bins: binsTable,
  parts: partsTable,
  structure: structureTable,
  offers: offersTable,
  movements: movementsTable,
  stock: stockTable,
  supply: supplyTable,
  "kit-orders": kitOrdersTable,
};
