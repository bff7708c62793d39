import { readRows } from "~/db/read-rows.server";
import { partKey } from "~/domain/planning/part-key";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type StockRow, stockKind } from "~/schemas/imports/stock";
import { readBalances } from "~/services/imports/book/read-balances.server";
import { readPartNames } from "~/services/imports/book/read-book-names.server";
import { runStatement } from "~/services/imports/book/run-statement.server";
import { writeRows } from "~/services/imports/book/write-rows.server";
import { adjustmentOf, type BalanceGoal, planBalances } from "~/services/imports/decide/plan-balances";
import type { ImportRow } from "~/services/imports/files/read-import-rows";
import { postMovements } from "~/services/stock/post-movements.server";
import type { ImportContext, ImportJob, ImportPlan } from "./import-job";
import { type ImportRequest, runImport } from "./run-import.server";

async function makeBins(goals: readonly BalanceGoal[], { transaction }: ImportContext): Promise<void> {
  const bins = new Map(goals.filter((goal) => goal.newBin).map((goal) => [partKey(goal.bin), goal.bin]));
  const rows = [...bins].map(([key, code]) => [key, code]);
  await writeRows("bin", ["bin_key", "code"], rows, { transaction, update: ["bin_key"] });
}

/** Lots whose quantity stays but whose date changes; the others get theirs with the posting. */
async function changeDates(goals: readonly BalanceGoal[], { transaction }: ImportContext): Promise<void> {
  for (const { part, lot, expiresOn, dateChanges } of goals) {
    if (!dateChanges) continue;
    await runStatement(
      "UPDATE lot SET expires_on = :expiresOn WHERE part_id = :partId AND lot_code = :lot",
      { expiresOn, partId: part.id, lot },
      transaction,
    );
  }
}

async function post(goals: readonly BalanceGoal[], context: ImportContext): Promise<void> {
  const { transaction, person, fileHash } = context;
  const movements = goals.flatMap((goal) => adjustmentOf(goal) ?? []);
  if (movements.length === 0) return;
  const [{ value }] = await readRows<{ value: number }>(
    "SELECT value FROM revision WHERE name = 'stock'",
    {},
    transaction,
  );
  await postMovements({
    actor: { personId: person.id, roles: person.roles },
    // The same file may set the same balances again after they have moved on: a key is good for one state of the stock.
    idempotencyKey: `stock-file-${fileHash}-${value}`,
    movements,
    transaction,
    most: movements.length,
  });
}

async function plan(rows: readonly ImportRow<StockRow>[], context: ImportContext): Promise<ImportPlan> {
  const { transaction } = context;
  const parts = await readPartNames(transaction);
  const book = await readBalances(transaction);
  const { decisions, goals } = planBalances(rows, parts, book);
  const moving = goals.filter((goal) => goal.dateChanges || adjustmentOf(goal) !== null);
  const write = async () => {
    await makeBins(moving, context);
    await post(moving, context);
    await changeDates(moving, context);
  };
  return { decisions, changes: moving.length > 0, write };
}

const job: ImportJob<StockRow> = {
  name: "stock",
  act: "import-stock",
  kind: stockKind,
  revisions: ["stock"],
  plan,
};

/**
 * Imports stock: each balance that the file names (part, bin, lot, state) is set by an adjustment; rows of the same
 * balance add up. Throws as `runImport` does.
 */
export function importStock(request: ImportRequest): Promise<ImportAnswer> {
  return runImport(job, request);
}
