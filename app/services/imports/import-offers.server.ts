import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type OfferRow, offersKind } from "~/schemas/imports/offers";
import {
  type BookName,
  readPartNames,
  readSupplierNames,
} from "~/services/imports/book/read-book-names.server";
import { trimOrNull } from "~/services/imports/book/read-part-records.server";
import { writeRows } from "~/services/imports/book/write-rows.server";
import {
  decideRecords,
  type RecordChange,
  type StoredRecord,
} from "~/services/imports/decide/decide-records";
import { checkStored } from "~/services/imports/files/check-stored";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import { unknownPart } from "~/services/imports/files/structure-problem";
import type { CsvProblem } from "~/utils/csv/csv-problem";
import { trimDecimal } from "~/utils/format/trim-decimal";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

type Read = Omit<OfferRow, "preferred"> & { id: number; preferred: number };
type Names = ReadonlyMap<string, BookName>;

const columns = [
  "supplier_id",
  "part_id",
  "from_quantity",
  "supplier_part_number",
  "buying_unit",
  "per_buying_unit",
  "minimum",
  "multiple",
  "unit_price",
  "currency",
  "lead_time_days",
  "preferred",
] as const;

function keyOf({ supplier, partNumber, fromQuantity }: OfferRow): string {
  return JSON.stringify([partKey(supplier), partKey(partNumber), fromQuantity]);
}

async function readStored(transaction: Transaction): Promise<Map<string, StoredRecord<OfferRow>>> {
  const rows = await readRows<Read>(
    `SELECT offer.id, supplier.code AS supplier, part.part_number AS partNumber,
      supplier_part_number AS supplierPartNumber, buying_unit AS buyingUnit, per_buying_unit AS perBuyingUnit,
      minimum, multiple, from_quantity AS fromQuantity, unit_price AS unitPrice, offer.currency,
      offer.lead_time_days AS leadTimeDays, preferred
     FROM offer JOIN supplier ON supplier.id = offer.supplier_id JOIN part ON part.id = offer.part_id`,
    {},
    transaction,
  );
  const records = rows.map(({ id, ...row }): StoredRecord<OfferRow> => {
    const value = {
      ...row,
      perBuyingUnit: trimDecimal(row.perBuyingUnit),
      minimum: trimOrNull(row.minimum),
      multiple: trimOrNull(row.multiple),
      fromQuantity: trimDecimal(row.fromQuantity),
      unitPrice: trimDecimal(row.unitPrice),
      preferred: Boolean(row.preferred),
    };
    return { id, value };
  });
  return new Map(records.map((record) => [keyOf(record.value), record]));
}

function checkRow(row: ImportRow<OfferRow>, suppliers: Names, parts: Names): CsvProblem[] {
  const { supplier, partNumber, perBuyingUnit, minimum, multiple, fromQuantity, unitPrice } = row.value;
  const at = row.at("supplier");
  const found = `the unknown supplier ${JSON.stringify(at.value)}`;
  return [
    suppliers.has(partKey(supplier)) ? null : { ...at, found, expected: "a supplier that is in the book" },
    parts.has(partKey(partNumber)) ? null : unknownPart(row, "part_number"),
    checkStored(row, "per_buying_unit", perBuyingUnit),
    checkStored(row, "minimum", minimum),
    checkStored(row, "multiple", multiple),
    checkStored(row, "from_quantity", fromQuantity),
    checkStored(row, "unit_price", unitPrice),
  ].filter((problem) => problem !== null);
}

/** Fills in what the row leaves to supplier and part, and spells both as the book does. */
function complete(row: ImportRow<OfferRow>, suppliers: Names, parts: Names): ImportRow<OfferRow> {
  const supplier = suppliers.get(partKey(row.value.supplier));
  const part = parts.get(partKey(row.value.partNumber));
  const value = {
    ...row.value,
    supplier: supplier?.name ?? row.value.supplier,
    partNumber: part?.name ?? row.value.partNumber,
    buyingUnit: row.value.buyingUnit ?? part?.unit ?? "EA",
    currency: row.value.currency ?? supplier?.unit ?? "EUR",
  };
  return { ...row, value };
}

function toColumns({ value }: RecordChange<OfferRow>, suppliers: Names, parts: Names): unknown[] {
  return [
    suppliers.get(partKey(value.supplier))?.id,
    parts.get(partKey(value.partNumber))?.id,
    value.fromQuantity,
    value.supplierPartNumber,
    value.buyingUnit,
    value.perBuyingUnit,
    value.minimum,
    value.multiple,
    value.unitPrice,
    value.currency,
    value.leadTimeDays,
    value.preferred,
  ];
}

async function plan(typed: readonly ImportRow<OfferRow>[], context: ImportContext): Promise<ImportPlan> {
  const { transaction } = context;
  const suppliers = await readSupplierNames(transaction);
  const parts = await readPartNames(transaction);
  const { decisions, changes } = decideRecords({
    rows: typed.map((row) => complete(row, suppliers, parts)),
    keyOf,
    keyColumn: "part_number",
    stored: await readStored(transaction),
    columns: context.columns,
    check: (row) => checkRow(row, suppliers, parts),
  });
  const write = () => {
    const values = changes.map((change) => toColumns(change, suppliers, parts));
    return writeRows("offer", columns, values, { transaction, update: columns.slice(3) });
  };
  return { decisions, changes: changes.length > 0, write };
}

const job: ImportJob<OfferRow> = {
  name: "offers",
  act: "import-offers",
  kind: offersKind,
  // The compiled book says from whom a part is bought.
  revisions: ["structure"],
  plan,
};

/** Imports offers by supplier, part and quantity from which they hold. Throws as `runImport` does. */
export function importOffers(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
