import { QueryTypes, Sequelize } from "sequelize";
import { Umzug, type UmzugStorage } from "umzug";
import { connectionOptions } from "./connection-options";
import { grantApplicationUser } from "./grant-application-user.server";
import { ALL_MIGRATIONS } from "./migrations/all-migrations";
import { runMigration } from "./migrations/migration";
import { TABLE } from "./migrations/table-options";

const LOCK_SECONDS = 60;

/**
 * Brings the schema up to date, one process at a time, and gives `applicationUser` its rights.
 * @param url the migrating user's address of the database, which must exist
 * @param applicationUser left out where one user does both
 * @returns the names of the migrations that ran now
 */
export async function migrateDatabase(url: string, applicationUser?: string): Promise<string[]> {
  // GET_LOCK belongs to one connection, so there is only one.
  const sequelize = new Sequelize({
    ...connectionOptions(url),
    pool: { max: 1, min: 1, acquire: 60_000, idle: 3_600_000 },
  });
  try {
    await takeLock(sequelize);
    const ran = await migrate(sequelize);
    if (applicationUser !== undefined) await grantApplicationUser(sequelize, applicationUser);
    return ran;
  } finally {
    await sequelize.close();
  }
}

async function takeLock(sequelize: Sequelize): Promise<void> {
  const [row] = await sequelize.query<{ taken: number | null }>(
    `SELECT GET_LOCK(CONCAT(DATABASE(), '-migrate'), ${LOCK_SECONDS}) AS taken`,
    { type: QueryTypes.SELECT },
  );
  if (row?.taken !== 1) {
    throw new Error(
      "Another process has been changing the database for a minute; wait for it to end, then start again.",
    );
  }
}

async function migrate(sequelize: Sequelize): Promise<string[]> {
  await sequelize.query(
    `CREATE TABLE IF NOT EXISTS migration (name VARCHAR(120) NOT NULL PRIMARY KEY, applied_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)) ${TABLE}`,
  );
  const umzug = new Umzug({
    migrations: ALL_MIGRATIONS.map((migration) => ({
      name: migration.name,
      up: () => runMigration(sequelize, migration),
    })),
    storage: migrationTable(sequelize),
    logger: undefined,
  });
  try {
    return (await umzug.up()).map((migration) => migration.name);
  } catch (error) {
    throw (error as { cause?: unknown }).cause ?? error;
  }
}

function migrationTable(sequelize: Sequelize): UmzugStorage {
  return {
    async executed() {
      const rows = await sequelize.query<{ name: string }>("SELECT name FROM migration ORDER BY name", {
        type: QueryTypes.SELECT,
      });
      return rows.map((row) => row.name);
    },
    async logMigration({ name }) {
      await sequelize.query("INSERT INTO migration (name) VALUES (:name)", { replacements: { name } });
    },
    async unlogMigration() {
      throw new Error("Migrations only go forward; restore a backup to go back.");
    },
  };
}
