import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import { type BinRow, binsKind } from "~/schemas/imports/bins";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { writeRows } from "~/services/imports/book/write-rows.server";
import {
  decideRecords,
  type RecordChange,
  type StoredRecord,
} from "~/services/imports/decide/decide-records";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

type Read = BinRow & { id: number; binKey: string };

const columns = ["bin_key", "code", "zone", "walk_order", "description"] as const;

async function readStored(transaction: Transaction): Promise<Map<string, StoredRecord<BinRow>>> {
  const rows = await readRows<Read>(
    "SELECT id, bin_key AS binKey, code AS bin, zone, walk_order AS walkOrder, description FROM bin",
    {},
    transaction,
  );
  return new Map(rows.map(({ id, binKey, ...value }) => [binKey, { id, value }]));
}

function toColumns({ value: { bin, zone, walkOrder, description } }: RecordChange<BinRow>): unknown[] {
  return [partKey(bin), bin, zone, walkOrder, description];
}

async function plan(rows: readonly ImportRow<BinRow>[], context: ImportContext): Promise<ImportPlan> {
  const { transaction } = context;
  const { decisions, changes } = decideRecords({
    rows,
    keyOf: (row) => partKey(row.bin),
    keyColumn: "bin",
    stored: await readStored(transaction),
    columns: context.columns,
  });
  const write = () =>
    writeRows("bin", columns, changes.map(toColumns), { transaction, update: columns.slice(1) });
  return { decisions, changes: changes.length > 0, write };
}

const job: ImportJob<BinRow> = { name: "bins", act: "import-bins", kind: binsKind, revisions: [], plan };

/** Imports bins by their code. Throws as `runImport` does. */
export function importBins(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
