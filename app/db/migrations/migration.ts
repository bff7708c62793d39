import type { DatabaseError, Sequelize } from "sequelize";

const TRIGGERS_NEED_TRUST = 1419;

/** One step forward of the schema. Its statements can run again after a stop half-way. */
export interface Migration {
  /** Kept in the database for good, so never renamed. */
  name: string;
  statements: readonly string[];
}

/**
 * Runs the statements of a migration in their order; the server commits each one by itself.
 * @throws Error one sentence, without the statement
 */
export async function runMigration(sequelize: Sequelize, migration: Migration): Promise<void> {
  try {
    for (const statement of migration.statements) await sequelize.query(statement);
  } catch (error) {
    throw new Error(sentenceFor(error as DatabaseError, migration.name));
  }
}

function sentenceFor(error: DatabaseError, name: string): string {
  const cause = error.parent as Error & { errno?: number; sqlMessage?: string };
  if (cause?.errno === TRIGGERS_NEED_TRUST) {
    return "The database refuses triggers while it keeps a binary log; start it with log_bin_trust_function_creators=1.";
  }
  return `The step ${name} stopped: ${cause?.sqlMessage ?? "the database did not answer"}. Nothing after it ran; correct the cause and migrate again.`;
}
