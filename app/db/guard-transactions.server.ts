import type { Sequelize, Transaction } from "sequelize";

interface TransactionState {
  tail: Promise<unknown>;
  failure: unknown;
}

const states = new WeakMap<Transaction, TransactionState>();

/** The first database error of a transaction, or undefined. A transaction with one can no longer be committed. */
export function failureOf(transaction: Transaction): unknown {
  return states.get(transaction)?.failure;
}

/**
 * Sends the statements of a transaction one after the other, and none after one has failed. Some errors undo
 * one statement and others the whole transaction, after which the server goes on in autocommit: an error
 * swallowed by a caller would commit half of its work.
 */
export function guardTransactions(sequelize: Sequelize): void {
  const send = sequelize.query.bind(sequelize) as (sql: unknown, options?: unknown) => Promise<unknown>;
  const guarded = (sql: unknown, options?: { transaction?: Transaction | null }): Promise<unknown> => {
    const transaction = options?.transaction;
    if (!transaction || isRollback(sql)) return send(sql, options);
    const state = stateOf(transaction);
    const result = state.tail.then(() => sendUnlessFailed(state, () => send(sql, options)));
    state.tail = result.catch(() => undefined);
    return result;
  };
  sequelize.query = guarded as typeof sequelize.query;
}

async function sendUnlessFailed(state: TransactionState, send: () => Promise<unknown>): Promise<unknown> {
  if (state.failure !== undefined) throw state.failure;
  try {
    return await send();
  } catch (error) {
    state.failure = error ?? new Error("A statement failed.");
    throw error;
  }
}

function stateOf(transaction: Transaction): TransactionState {
  const known = states.get(transaction);
  if (known) return known;
  const state: TransactionState = { tail: Promise.resolve(), failure: undefined };
  states.set(transaction, state);
  return state;
}

function isRollback(sql: unknown): boolean {
  return typeof sql === "string" && /^\s*ROLLBACK/i.test(sql);
}
