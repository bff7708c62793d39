import type { Transaction } from "sequelize";
import { readRows } from "~/db/read-rows.server";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type SupplyRow, supplyKind } from "~/schemas/imports/supply";
import { readPartNames } from "~/services/imports/book/read-book-names.server";
import { readOpenOrders } from "~/services/imports/book/read-open-orders.server";
import { runStatement } from "~/services/imports/book/run-statement.server";
import { writeRows } from "~/services/imports/book/write-rows.server";
import { planSupply, type SupplyChange } from "~/services/imports/decide/plan-supply";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

/** From whom a part is bought first, by part id. */
async function readPreferredSuppliers(transaction: Transaction): Promise<Map<number, number>> {
  const rows = await readRows<{ partId: number; supplierId: number }>(
    "SELECT part_id AS partId, supplier_id AS supplierId FROM offer ORDER BY preferred, from_quantity DESC, id DESC",
    {},
    transaction,
  );
  return new Map(rows.map(({ partId, supplierId }) => [partId, supplierId]));
}

/** Makes the purchase orders that are missing, each with the supplier of its first part, and gives all ids by number. */
async function makeOrders(
  lines: readonly SupplyChange[],
  transaction: Transaction,
): Promise<Map<string, number>> {
  const suppliers = await readPreferredSuppliers(transaction);
  const firsts = new Map<string, SupplyChange>();
  for (const line of lines) if (!firsts.has(line.number)) firsts.set(line.number, line);
  const rows = [...firsts].map(([number, line]) => [number, suppliers.get(line.part.id) ?? null, "sent"]);
  await writeRows("purchase_order", ["number", "supplier_id", "state"], rows, {
    transaction,
    update: ["number"],
  });
  const orders = await readRows<{ id: number; number: string }>(
    "SELECT id, number FROM purchase_order WHERE number IN (:numbers)",
    { numbers: [...firsts.keys()] },
    transaction,
  );
  return new Map(orders.map(({ id, number }) => [number, id]));
}

async function addPurchaseLines(lines: readonly SupplyChange[], transaction: Transaction): Promise<void> {
  if (lines.length === 0) return;
  const ids = await makeOrders(lines, transaction);
  const last = await readRows<{ orderId: number; line: number }>(
    `SELECT purchase_order_id AS orderId, MAX(line_number) AS line FROM purchase_order_line
     WHERE purchase_order_id IN (:ids) GROUP BY purchase_order_id`,
    { ids: [...ids.values()] },
    transaction,
  );
  const numbers = new Map(last.map(({ orderId, line }) => [orderId, line]));
  const rows = lines.map(({ number, part, quantity, due }) => {
    const orderId = ids.get(number) as number;
    const line = (numbers.get(orderId) ?? 0) + 1;
    numbers.set(orderId, line);
    return [orderId, line, part.id, quantity, due];
  });
  const columns = ["purchase_order_id", "line_number", "part_id", "quantity", "due_on"];
  await writeRows("purchase_order_line", columns, rows, { transaction });
}

async function write(changes: readonly SupplyChange[], transaction: Transaction): Promise<void> {
  const added = changes.filter((change) => change.id === null);
  const bought = added.filter((change) => change.part.sourcing === "buy");
  const built = added.filter((change) => change.part.sourcing !== "buy");
  await addPurchaseLines(bought, transaction);
  const rows = built.map(({ number, part, quantity, due }) => [number, part.id, quantity, due, "released"]);
  await writeRows("shop_order", ["number", "part_id", "quantity", "due_on", "state"], rows, { transaction });
  for (const { id, part, quantity, due } of changes) {
    if (id === null) continue;
    const statement =
      part.sourcing === "buy"
        ? "UPDATE purchase_order_line SET quantity = received + :quantity, due_on = :due, closed = FALSE WHERE id = :id"
        : "UPDATE shop_order SET quantity = finished + :quantity, due_on = :due WHERE id = :id";
    await runStatement(statement, { id, quantity, due }, transaction);
  }
}

async function plan(
  rows: readonly ImportRow<SupplyRow>[],
  { transaction, columns }: ImportContext,
): Promise<ImportPlan> {
  const parts = await readPartNames(transaction);
  const orders = await readOpenOrders(transaction);
  const { decisions, changes } = planSupply(rows, { parts, orders, columns });
  return { decisions, changes: changes.length > 0, write: () => write(changes, transaction) };
}

const job: ImportJob<SupplyRow> = {
  name: "supply",
  act: "import-supply",
  kind: supplyKind,
  revisions: ["orders"],
  plan,
};

/**
 * Imports open orders: a row of a buy part is a line of a purchase order, one of a make part a shop order; quantities
 * are what is still to come. Throws as `runImport` does.
 */
export function importSupply(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
