import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type KitOrderRow, kitOrdersKind } from "~/schemas/imports/kit-orders";
import { type BookName, readPartNames } from "~/services/imports/book/read-book-names.server";
import { runStatement } from "~/services/imports/book/run-statement.server";
import { writeRows } from "~/services/imports/book/write-rows.server";
import { checkKitOrders, type StoredKitOrder } from "~/services/imports/decide/check-kit-orders";
import { decideRecords, type RecordChange } from "~/services/imports/decide/decide-records";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import { findKits } from "~/services/kit-orders/find-kits.server";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

type Read = Omit<KitOrderRow, "options"> & {
  id: number;
  state: StoredKitOrder["state"];
  options: string | null;
};

const columns = ["number", "part_id", "customer", "serial", "wanted_on", "priority", "note"] as const;

async function readStored(transaction: Transaction): Promise<Map<string, StoredKitOrder>> {
  const rows = await readRows<Read>(
    `SELECT kit_order.id, number, part.part_number AS kit, customer, serial, wanted_on AS wantedOn, priority,
      (SELECT GROUP_CONCAT(option_code ORDER BY option_code SEPARATOR '\\n') FROM kit_order_option
        WHERE kit_order_id = kit_order.id) AS options, note, state
     FROM kit_order JOIN part ON part.id = kit_order.part_id`,
    {},
    transaction,
  );
  return new Map(
    rows.map(({ id, state, options, ...row }) => {
      const value = { ...row, options: options?.split("\n") ?? [] };
      return [row.number, { id, state, value }];
    }),
  );
}

async function write(
  changes: readonly RecordChange<KitOrderRow>[],
  parts: ReadonlyMap<string, BookName>,
  transaction: Transaction,
): Promise<void> {
  const values = changes.map(({ value }) => {
    const { number, kit, customer, serial, wantedOn, priority, note } = value;
    return [number, parts.get(partKey(kit))?.id, customer, serial, wantedOn, priority, note];
  });
  await writeRows("kit_order", columns, values, { transaction, update: columns.slice(1), versioned: true });
  const numbers = changes.map((change) => change.value.number);
  const written = await readRows<{ id: number; number: string }>(
    "SELECT id, number FROM kit_order WHERE number IN (:numbers)",
    { numbers },
    transaction,
  );
  const ids = new Map(written.map(({ id, number }) => [number, id]));
  await runStatement(
    "DELETE FROM kit_order_option WHERE kit_order_id IN (:ids)",
    { ids: [...ids.values()] },
    transaction,
  );
  const options = changes.flatMap(({ value }) =>
    value.options.map((option) => [ids.get(value.number), option]),
  );
  await writeRows("kit_order_option", ["kit_order_id", "option_code"], options, { transaction });
}

/** The kit as the book spells it, the options in one order. */
function spell(row: ImportRow<KitOrderRow>, parts: ReadonlyMap<string, BookName>): ImportRow<KitOrderRow> {
  const kit = parts.get(partKey(row.value.kit))?.name ?? row.value.kit;
  return { ...row, value: { ...row.value, kit, options: [...row.value.options].sort() } };
}

async function plan(typed: readonly ImportRow<KitOrderRow>[], context: ImportContext): Promise<ImportPlan> {
  const { transaction } = context;
  const parts = await readPartNames(transaction);
  const stored = await readStored(transaction);
  const { decisions, changes } = decideRecords({
    rows: typed.map((row) => spell(row, parts)),
    keyOf: (row) => row.number,
    keyColumn: "number",
    stored,
    columns: context.columns,
  });
  checkKitOrders(decisions, stored, await findKits(transaction));
  return { decisions, changes: changes.length > 0, write: () => write(changes, parts, transaction) };
}

const job: ImportJob<KitOrderRow> = {
  name: "kit-orders",
  act: "import-kit-orders",
  kind: kitOrdersKind,
  revisions: ["orders"],
  plan,
};

/** Imports kit orders by number, one kit each. Throws as `runImport` does. */
export function importKitOrders(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
