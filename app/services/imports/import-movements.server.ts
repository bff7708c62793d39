import { createHash } from "node:crypto";
import type { Transaction } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { readRows } from "~/db/read-rows.server";
import type { PostedKind } from "~/domain/stock/types";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { type MovementRow, movementsKind } from "~/schemas/imports/movements";
import { type ImportRow, readImportRows } from "~/services/imports/files/read-import-rows";
import { assertMay } from "~/services/people/assert-may.server";
import { postMovements } from "~/services/stock/post-movements.server";
import { reverseMovement } from "~/services/stock/reverse-movement.server";
import type { StockActor } from "~/services/stock/stock-actor";
import { AppError, type FieldError } from "~/utils/errors";
import type { Decision } from "./import-job";
import { presentRows } from "./present-import";
import { refuseFile, refuseRows } from "./refuse-import";
import type { ImportRequest } from "./run-import.server";

type Row = ImportRow<MovementRow>;

interface Posting {
  actor: StockActor;
  fileHash: string;
  transaction: Transaction;
  /** Movement ids by the numbers that the file gives them. */
  ids: Map<number, number>;
}

const chunkSize = 2_000;

const keyAt = (fileHash: string, start: number) => `movements-file-${fileHash}-${start}`;

/** Runs of movements that are posted together; a reversal is one of its own. */
function splitRows(rows: readonly Row[]): Row[][] {
  const runs: Row[][] = [];
  for (const row of rows) {
    const run = runs.at(-1);
    const joins =
      run && run.length < chunkSize && row.value.kind !== "reverse" && run[0].value.kind !== "reverse";
    if (joins) run.push(row);
    else runs.push([row]);
  }
  return runs;
}

async function reverse({ value: { reverses, reason } }: Row, key: string, posting: Posting): Promise<number> {
  const movementId = posting.ids.get(reverses as number);
  if (movementId === undefined) {
    const message = `There is no movement with number ${reverses} above this row.`;
    throw new AppError("invalid", message, { errors: [{ line: 1, column: "reverses", message }] });
  }
  const { actor, transaction } = posting;
  return (await reverseMovement({ actor, movementId, reason, idempotencyKey: key, transaction })).id;
}

async function postRun(run: readonly Row[], key: string, posting: Posting): Promise<number[]> {
  if (run[0].value.kind === "reverse") return [await reverse(run[0], key, posting)];
  const movements = run.map(({ value }) => ({ ...value, kind: value.kind as PostedKind }));
  const { actor, transaction } = posting;
  const posted = await postMovements({ actor, idempotencyKey: key, movements, transaction, most: chunkSize });
  return posted.movements.map(({ id }) => id);
}

/** Posts all rows in their order. @throws AppError whose errors name lines of the file */
async function postRows(rows: readonly Row[], posting: Posting): Promise<void> {
  let start = 0;
  for (const run of splitRows(rows)) {
    try {
      const ids = await postRun(run, keyAt(posting.fileHash, start), posting);
      for (const [place, { value }] of run.entries())
        if (value.number !== null) posting.ids.set(value.number, ids[place]);
    } catch (error) {
      if (!(error instanceof AppError) || !["invalid", "conflict", "not-found"].includes(error.code))
        throw error;
      const named = error.errors.length > 0 ? error.errors : [{ line: 1, message: error.message }];
      const errors = named.map((each) => ({ ...each, line: run[(each.line ?? 1) - 1].line }));
      throw new AppError(error.code, error.message, { errors });
    }
    start += run.length;
  }
}

async function isPosted(fileHash: string, transaction: Transaction): Promise<boolean> {
  const statement = "SELECT id FROM idempotency_key WHERE `key` = :key AND status = 'done'";
  return (await readRows(statement, { key: keyAt(fileHash, 0) }, transaction)).length > 0;
}

function decide(rows: readonly Row[], posted: boolean, errors: readonly FieldError[]): Decision[] {
  const refused = new Map(errors.map((error) => [error.line, error]));
  return rows.map((row) => {
    const error = refused.get(row.line);
    const problems = error
      ? [{ ...row.at(error.column ?? "part_number"), found: "this movement", expected: error.message }]
      : [];
    return { row, before: posted ? row.value : null, after: row.value, problems };
  });
}

class OnlyTried extends Error {}

/** What posting would be refused for; whatever it does is undone. */
async function tryRows(rows: readonly Row[], posting: Omit<Posting, "transaction">): Promise<FieldError[]> {
  try {
    await inTransaction(async (transaction) => {
      await postRows(rows, { ...posting, transaction });
      throw new OnlyTried();
    });
  } catch (error) {
    if (error instanceof OnlyTried) return [];
    if (error instanceof AppError && error.errors.length > 0) return error.errors;
    throw error;
  }
  return [];
}

/**
 * Posts a file of movements in their order, all or none, or says what would be refused; the same file again posts
 * nothing. A row of kind reverse takes back the whole movement whose number it names.
 * @throws AppError "forbidden"; "invalid" or "conflict" with errors by line of the file
 */
export async function importMovements({
  bytes,
  person,
  dryRun = false,
  headers,
}: ImportRequest): Promise<ImportAnswer> {
  const { id, roles } = assertMay(person, "import-stock");
  const read = readImportRows(bytes, movementsKind, headers);
  if (!read.ok) throw refuseFile(read.problems);
  const { rows, refused, encoding, delimiter } = read;
  const fileHash = createHash("sha256").update(bytes).digest("hex");
  const posting = { actor: { personId: id, roles }, fileHash, ids: new Map<number, number>() };
  const present = (posted: boolean, errors: readonly FieldError[]): ImportAnswer => {
    const decisions = decide(rows, posted, errors);
    return { kind: "movements", dryRun, encoding, delimiter, ...presentRows({ decisions }, refused) };
  };
  const posted = await inTransaction((transaction) => isPosted(fileHash, transaction));
  if (posted) return present(true, []);
  if (dryRun) return present(false, refused.length > 0 ? [] : await tryRows(rows, posting));
  if (refused.length > 0) {
    throw refuseRows(
      present(false, []).rows.flatMap((row) => row.errors),
      refused.length,
    );
  }
  await inTransaction(async (transaction) => {
    posting.ids.clear();
    await postRows(rows, { ...posting, transaction });
  });
  return present(false, []);
}
