import { QueryTypes, type Sequelize } from "sequelize";
import { APPEND_ONLY_TABLES } from "./append-only-tables";

const HOSTS = ["localhost", "127.0.0.1", "%"];
const NO_SUCH_USER = new Set([1133, 1396, 1410]);
const USER_NAME = /^[A-Za-z0-9_.-]{1,80}$/;

/**
 * Gives the application's user what it may do: read and write rows, but only add to the append-only tables.
 * @throws Error where the user is not known to the server.
 */
export async function grantApplicationUser(sequelize: Sequelize, user: string): Promise<void> {
  if (!USER_NAME.test(user)) {
    throw new Error(
      "The user in DATABASE_URL has a name with unusual characters; use letters, digits and underscores.",
    );
  }
  const tables = await readTables(sequelize);
  let granted = 0;
  for (const host of HOSTS) granted += (await grantAtHost(sequelize, `'${user}'@'${host}'`, tables)) ? 1 : 0;
  if (granted === 0) {
    throw new Error(
      `The database knows no user ${user}; create it for 127.0.0.1 and localhost, then migrate again.`,
    );
  }
}

async function readTables(sequelize: Sequelize): Promise<string[]> {
  const rows = await sequelize.query<{ name: string }>(
    "SELECT TABLE_NAME AS name FROM information_schema.TABLES WHERE TABLE_SCHEMA = DATABASE() AND TABLE_TYPE = 'BASE TABLE' ORDER BY TABLE_NAME",
    { type: QueryTypes.SELECT },
  );
  return rows.map((row) => row.name);
}

async function grantAtHost(sequelize: Sequelize, account: string, tables: string[]): Promise<boolean> {
  try {
    for (const table of tables) {
      const appendOnly = (APPEND_ONLY_TABLES as readonly string[]).includes(table);
      const rights =
        table === "migration" ? "SELECT" : appendOnly ? "SELECT, INSERT" : "SELECT, INSERT, UPDATE, DELETE";
      await sequelize.query(`GRANT ${rights} ON \`${table}\` TO ${account}`);
    }
    return true;
  } catch (error) {
    const { parent } = error as { parent?: { errno?: number } };
    if (parent?.errno !== undefined && NO_SUCH_USER.has(parent.errno)) return false;
    throw error;
  }
}
