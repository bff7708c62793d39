import type { Transaction } from "sequelize";
import { AppError } from "~/utils/errors";
import { sequelize } from "./client.server";
import { failureOf } from "./guard-transactions.server";
import { isTransient } from "./is-transient";

const MOST_TRIES = 8;
const MOST_MILLISECONDS = 5_000;
const RETRY_AFTER_SECONDS = 2;

/**
 * Runs `work` in one transaction (READ COMMITTED, as every connection is set) and commits it. After a deadlock, a lock wait, a changed record
 * or a lost connection the whole of it runs again, so `work` must keep all its effects in the transaction.
 * With `transaction` given, `work` joins that one and whoever began it retries and commits.
 * @throws AppError "busy" after 8 tries or 5 seconds; whatever else `work` throws, with nothing kept.
 */
export async function inTransaction<Result>(
  work: (transaction: Transaction) => Promise<Result>,
  options: { transaction?: Transaction } = {},
): Promise<Result> {
  if (options.transaction) return work(options.transaction);
  const deadline = Date.now() + MOST_MILLISECONDS;
  for (let tries = 1; ; tries++) {
    try {
      return await tryOnce(work);
    } catch (error) {
      if (!isTransient(error)) throw error;
      const wait = 10 + Math.random() * 390;
      if (tries >= MOST_TRIES || Date.now() + wait > deadline) throw busy();
      await new Promise((resolve) => setTimeout(resolve, wait));
    }
  }
}

async function tryOnce<Result>(work: (transaction: Transaction) => Promise<Result>): Promise<Result> {
  const transaction = await sequelize.transaction();
  try {
    const result = await work(transaction);
    const swallowed = failureOf(transaction);
    if (swallowed !== undefined) throw swallowed;
    await transaction.commit();
    return result;
  } catch (error) {
    await rollBack(transaction);
    throw causeOf(error, failureOf(transaction));
  }
}

/** A failed statement that another try may cure counts, even where something else came of it; an answer stays one. */
function causeOf(error: unknown, failure: unknown): unknown {
  return isTransient(failure) && !(error instanceof AppError) ? failure : error;
}

async function rollBack(transaction: Transaction): Promise<void> {
  if ((transaction as unknown as { finished?: string }).finished) return;
  try {
    await transaction.rollback();
  } catch {
    // The connection is gone or was closed by the failed rollback; the server undoes the transaction itself.
  }
}

function busy(): AppError {
  return new AppError("busy", "The stockroom is busy; nothing was changed. Try again in a moment.", {
    retryAfter: RETRY_AFTER_SECONDS,
  });
}
