import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type SupplierRow, suppliersKind } from "~/schemas/imports/suppliers";
import { writeRows } from "~/services/imports/book/write-rows.server";
import {
  decideRecords,
  type RecordChange,
  type StoredRecord,
} from "~/services/imports/decide/decide-records";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

type Read = SupplierRow & { id: number; supplierKey: string };

const columns = [
  "supplier_key",
  "code",
  "name",
  "email",
  "phone",
  "currency",
  "lead_time_days",
  "note",
] as const;

async function readStored(transaction: Transaction): Promise<Map<string, StoredRecord<SupplierRow>>> {
  const rows = await readRows<Read>(
    `SELECT id, supplier_key AS supplierKey, code AS supplier, name, email, phone, currency,
      lead_time_days AS leadTimeDays, note FROM supplier`,
    {},
    transaction,
  );
  return new Map(rows.map(({ id, supplierKey, ...value }) => [supplierKey, { id, value }]));
}

function toColumns({ value }: RecordChange<SupplierRow>): unknown[] {
  const { supplier, name, email, phone, currency, leadTimeDays, note } = value;
  return [partKey(supplier), supplier, name, email, phone, currency, leadTimeDays, note];
}

async function plan(rows: readonly ImportRow<SupplierRow>[], context: ImportContext): Promise<ImportPlan> {
  const { transaction } = context;
  const { decisions, changes } = decideRecords({
    rows,
    keyOf: (row) => partKey(row.supplier),
    keyColumn: "supplier",
    stored: await readStored(transaction),
    columns: context.columns,
  });
  const write = () =>
    writeRows("supplier", columns, changes.map(toColumns), { transaction, update: columns.slice(1) });
  return { decisions, changes: changes.length > 0, write };
}

const job: ImportJob<SupplierRow> = {
  name: "suppliers",
  act: "import-suppliers",
  kind: suppliersKind,
  // The compiled book says from whom a part is bought.
  revisions: ["structure"],
  plan,
};

/** Imports suppliers by their code. Throws as `runImport` does. */
export function importSuppliers(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
