import { QueryTypes, type Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";

const chunkSize = 1_000;

interface Options {
  transaction: Transaction;
  update?: readonly string[];
  /** The table counts the changes of a row. */
  versioned?: boolean;
}

/**
 * Writes rows in chunks of one statement each. `update` names the columns that are overwritten where a unique key is
 * there already; without it the key must be new.
 */
export async function writeRows(
  table: string,
  columns: readonly string[],
  rows: readonly (readonly unknown[])[],
  { transaction, update = [], versioned = false }: Options,
): Promise<void> {
  const changes = update.map((column) => `\`${column}\` = VALUES(\`${column}\`)`);
  const overwrite = [...changes, ...(versioned ? ["version = version + 1"] : [])].join(", ");
  const names = columns.map((column) => `\`${column}\``).join(", ");
  const statement = `INSERT INTO \`${table}\` (${names}) VALUES :values${overwrite && ` ON DUPLICATE KEY UPDATE ${overwrite}`}`;
  for (let start = 0; start < rows.length; start += chunkSize) {
    const values = rows.slice(start, start + chunkSize);
    await sequelize.query(statement, { replacements: { values }, type: QueryTypes.INSERT, transaction });
  }
}
