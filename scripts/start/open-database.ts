import path from "node:path";
import { say } from "../bootstrap/say.mjs";
import { askAsAdmin } from "../database/ask-as-admin";
import { createSchema, type SchemaAddresses } from "../database/create-schema";
import { startDatabase } from "../database/start-database";
import { stopDatabase } from "../database/stop-database";
import type { StopRequest } from "./stop-request";
import { watchDatabase } from "./watch-database";

/** The schema of the application on this machine's own server. */
const schemaName = "cotterpin";

export interface OpenDatabase {
  addresses: SchemaAddresses;
  /** Empties the schema; given only where the server is ours alone. */
  empty?: () => Promise<void>;
}

/** The server that DATABASE_URL names, or else one of our own under the local folder, which is stopped with us. */
export async function openDatabase(local: string, stop: StopRequest): Promise<OpenDatabase> {
  const { DATABASE_URL, DATABASE_MIGRATE_URL } = process.env;
  if (DATABASE_URL) {
    return { addresses: { DATABASE_URL, DATABASE_MIGRATE_URL: DATABASE_MIGRATE_URL || DATABASE_URL } };
  }
  say("Starting the database");
  const folder = path.join(local, "database");
  const starting = startDatabase(folder, { durable: true });
  let endWatch: (() => Promise<void>) | undefined;
  stop.before(async () => {
    await endWatch?.();
    // A server found half-way would be left behind.
    await Promise.race([
      starting.catch(() => {}),
      new Promise((resolve) => setTimeout(resolve, 1_500).unref()),
    ]);
    await stopDatabase(folder, 1_800);
  });
  const database = await starting;
  endWatch = watchDatabase(database);
  const ask = (statements: string) => askAsAdmin(database.folder.socket, statements);
  return {
    addresses: await createSchema(database, schemaName),
    empty: async () => {
      await ask(`DROP DATABASE ${schemaName};`);
      await createSchema(database, schemaName);
    },
  };
}
