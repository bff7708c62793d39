import { QueryTypes, type Transaction, UniqueConstraintError } from "sequelize";
import { sequelize } from "~/db/client.server";
import { inTransaction } from "~/db/in-transaction.server";
import { AppError } from "~/utils/errors";
import { assertKey } from "./assert-key";

interface Once {
  /** Made by the client before sending: 8 to 200 visible ASCII characters. */
  key: string;
  /** Of the act, the actor and the content. */
  fingerprint: string;
  actorId: number | null;
  transaction?: Transaction;
}

interface StoredKey {
  id: number;
  fingerprint: string;
  status: "running" | "done";
  result: unknown;
}

class KeyTaken extends Error {}

const WAIT_SECONDS = 2;
const LOCK_WAIT_TIMEOUT = 1205;

/**
 * Does `work` once for a key, however often it is asked for, and gives the first answer to every later asker. The
 * key, the work and the answer are committed together, so there is no key without an answer.
 * @param work its answer is kept as JSON
 * @throws AppError "bad-request" for a malformed key, "invalid" for a key used with other content, "conflict" while the
 * first is still running
 */
export async function runOnce<Result>(
  once: Once,
  work: (transaction: Transaction, keyId: number) => Promise<Result>,
): Promise<Result> {
  assertKey(once.key);
  try {
    return await attempt(once, work);
  } catch (error) {
    // Somebody else committed the key between our look and our claim: now it can be read.
    if (!(error instanceof KeyTaken)) throw error;
    if (once.transaction) throw stillRunning();
    return await attempt(once, work);
  }
}

function attempt<Result>(
  { key, fingerprint, actorId, transaction: outer }: Once,
  work: (transaction: Transaction, keyId: number) => Promise<Result>,
): Promise<Result> {
  return inTransaction(
    async (transaction) => {
      const known = await readKey(key, transaction);
      if (known) return replay<Result>(known, fingerprint);
      const keyId = await claimKey({ key, fingerprint, actorId }, transaction);
      const result = await work(transaction, keyId);
      await keepResult(keyId, result, transaction);
      return result;
    },
    { transaction: outer },
  );
}

async function readKey(key: string, transaction: Transaction): Promise<StoredKey | undefined> {
  const [row] = await sequelize.query<StoredKey>(
    "SELECT id, fingerprint, status, result FROM idempotency_key WHERE `key` = :key",
    { replacements: { key }, type: QueryTypes.SELECT, transaction },
  );
  return row;
}

function replay<Result>(known: StoredKey, fingerprint: string): Result {
  if (known.fingerprint !== fingerprint) {
    throw new AppError(
      "invalid",
      "This Idempotency-Key was used for something else; make a new one for a new request.",
    );
  }
  if (known.status !== "done") throw stillRunning();
  return known.result as Result;
}

async function claimKey(row: Omit<Once, "transaction">, transaction: Transaction): Promise<number> {
  try {
    const [keyId] = await sequelize.query(
      `SET STATEMENT innodb_lock_wait_timeout = ${WAIT_SECONDS} FOR
       INSERT INTO idempotency_key (\`key\`, fingerprint, actor_id) VALUES (:key, :fingerprint, :actorId)`,
      { replacements: { ...row }, type: QueryTypes.INSERT, transaction },
    );
    return keyId;
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw new KeyTaken();
    if ((error as { parent?: { errno?: number } }).parent?.errno === LOCK_WAIT_TIMEOUT) throw stillRunning();
    throw error;
  }
}

async function keepResult(id: number, result: unknown, transaction: Transaction): Promise<void> {
  await sequelize.query("UPDATE idempotency_key SET status = 'done', result = :result WHERE id = :id", {
    replacements: { id, result: JSON.stringify(result) },
    type: QueryTypes.UPDATE,
    transaction,
  });
}

function stillRunning(): AppError {
  return new AppError(
    "conflict",
    "The first request with this Idempotency-Key is still running; send it again in a moment.",
  );
}
