import mariadb, { type Connection, type ConnectionConfig } from "mariadb";
import { afterAll, beforeAll, beforeEach, inject } from "vitest";
import { EXACT_DRIVER } from "~/db/connection-options";

/** A worker's own schema, and a connection as the user who may do all on it. */
export interface TestDatabase {
  /** Address for the application's user, who may only add to movements and the audit. */
  appUrl: string;
  /** Address for the migrating user. */
  migrateUrl: string;
  /** Runs one statement as the migrating user, past the application. */
  query(sql: string, values?: unknown[]): Promise<Record<string, unknown>[]>;
  /** Makes the schema as the migrations left it, in the middle of a test. */
  clear(): Promise<void>;
}

/**
 * Gives the tests of a file a migrated schema that is as the migrations left it before each test. DATABASE_URL names it
 * already, so `~/db/client.server` and the services work on it.
 */
export function useTestDatabase(): TestDatabase {
  const schema = inject("workerSchemas")[Number(process.env.VITEST_POOL_ID)];
  let connection: Connection;
  beforeAll(async () => {
    connection = await mariadb.createConnection(connectionConfig(schema.DATABASE_MIGRATE_URL));
    await connection.query("SET SESSION lock_wait_timeout = 10");
    await keepBaseline(connection, schema.baseline);
  });
  beforeEach(() => emptyTables(connection, schema.baseline));
  afterAll(() => connection?.end());
  return {
    appUrl: schema.DATABASE_URL,
    migrateUrl: schema.DATABASE_MIGRATE_URL,
    query: (sql, values) => connection.query(sql, values),
    clear: () => emptyTables(connection, schema.baseline),
  };
}

function connectionConfig(address: string): ConnectionConfig {
  const url = new URL(address);
  return {
    host: url.hostname,
    port: Number(url.port),
    user: url.username,
    password: url.password,
    database: url.pathname.slice(1),
    timezone: "Z",
    ...EXACT_DRIVER,
  };
}

/** The migrations' own record of what ran stays. */
const isMigrationRecord = (table: string) => /migration|sequelizemeta/i.test(table);

async function tablesWithRows(connection: Connection): Promise<string[]> {
  const names: { name: string }[] = await connection.query(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_type = 'BASE TABLE'",
  );
  const tables = names.map(({ name }) => name).filter((name) => !isMigrationRecord(name));
  if (tables.length === 0) return [];
  const questions = tables.map(
    (table) => `SELECT '${table}' AS name FROM DUAL WHERE EXISTS (SELECT 1 FROM \`${table}\`)`,
  );
  const full: { name: string }[] = await connection.query(questions.join(" UNION ALL "));
  return full.map(({ name }) => name);
}

/** Copies what the migrations put in, once a run: the marker table says that it was done. */
async function keepBaseline(connection: Connection, baseline: string): Promise<void> {
  const done = await connection.query("SELECT 1 FROM information_schema.tables WHERE table_schema = ?", [
    baseline,
  ]);
  if (done.length > 0) return;
  for (const table of await tablesWithRows(connection)) {
    await connection.query(`CREATE TABLE \`${baseline}\`.\`${table}\` AS SELECT * FROM \`${table}\``);
  }
  await connection.query(`CREATE TABLE \`${baseline}\`.\`kept\` (at INT)`);
}

/** TRUNCATE, since a DELETE is refused by the tables that may only be added to. */
async function emptyTables(connection: Connection, baseline: string): Promise<void> {
  await connection.query("SET SESSION foreign_key_checks = 0");
  for (const table of await tablesWithRows(connection)) await connection.query(`TRUNCATE TABLE \`${table}\``);
  const kept: { name: string }[] = await connection.query(
    "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = ? AND table_name <> 'kept'",
    [baseline],
  );
  for (const { name } of kept)
    await connection.query(`INSERT INTO \`${name}\` SELECT * FROM \`${baseline}\`.\`${name}\``);
  await connection.query("SET SESSION foreign_key_checks = 1");
}
