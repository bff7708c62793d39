import { createHash } from "node:crypto";
import type { Transaction } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { type MovementRow, movementsKind } from "~/schemas/imports/movements";
import { type ImportRow, readImportRows } from "~/services/imports/files/read-import-rows";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { postMovements } from "~/services/stock/post-movements.server";
import { AppError } from "~/utils/errors";
import { presentProblem } from "./present-import";

interface MovementsFile {
  bytes: Uint8Array;
  person: CurrentPerson;
}

const chunkSize = 2_000;

async function postChunk(
  rows: readonly ImportRow<MovementRow>[],
  {
    person,
    idempotencyKey,
    transaction,
  }: { person: CurrentPerson; idempotencyKey: string; transaction: Transaction },
): Promise<void> {
  try {
    await postMovements({
      actor: { personId: person.id, roles: person.roles },
      idempotencyKey,
      movements: rows.map((row) => row.value),
      transaction,
      most: chunkSize,
    });
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const errors = error.errors.map((each) => ({ ...each, line: rows[(each.line ?? 1) - 1].line }));
    throw new AppError(error.code, error.message, { errors });
  }
}

/**
 * Posts a file of movements in their order, all or none; the same file again posts nothing.
 * @returns how many movements the file has
 * @throws AppError as `postMovements` does, with errors by line of the file
 */
export async function importMovements({ bytes, person }: MovementsFile): Promise<number> {
  assertMay(person, "import-stock");
  const read = readImportRows(bytes, movementsKind);
  const problems = read.ok ? read.refused.flatMap((row) => row.problems) : read.problems;
  if (!read.ok || problems.length > 0) {
    const errors = problems.slice(0, 100).map(presentProblem);
    throw new AppError("invalid", "The file cannot be read; nothing was changed.", { errors });
  }
  const hash = createHash("sha256").update(bytes).digest("hex");
  await inTransaction(async (transaction) => {
    for (let start = 0; start < read.rows.length; start += chunkSize) {
      const idempotencyKey = `movements-file-${hash}-${start}`;
      await postChunk(read.rows.slice(start, start + chunkSize), { person, idempotencyKey, transaction });
    }
  });
  return read.rows.length;
}
