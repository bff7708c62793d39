import { existsSync, mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import { askAsAdmin } from "../database/ask-as-admin";
import { identify, isAlive } from "../database/process-identity";
import { waitForLock } from "../database/process-lock";
import { type Database, startDatabase } from "../database/start-database";
import { stopDatabase } from "../database/stop-database";
import { localFolder } from "../start/local-folder";

const schemaPrefix = "cotterpin_test";

export interface TestServer {
  database: Database;
  /** Names that no other run uses: `cotterpin_test_<process>_<what>`. */
  schemaName(what: string): string;
  /** Gives up the server; the last run that does stops it. */
  leave(): Promise<void>;
}

/**
 * Joins the tests' own database server under `.local/test/`, starting it if no run uses it yet. Runs may overlap:
 * each one leaves a note with its process number while it needs the server.
 */
export async function joinTestServer(): Promise<TestServer> {
  const folder = path.join(localFolder(), "test");
  const runs = path.join(folder, "runs");
  const databasePath = path.join(folder, "database");
  mkdirSync(runs, { recursive: true, mode: 0o700 });
  const lock = await waitForLock(path.join(folder, "joining.lock"));
  try {
    writeFileSync(path.join(runs, `${process.pid}.json`), JSON.stringify(identify(process.pid)));
    const database = await startDatabase(databasePath, { durable: false });
    await dropSchemas(database, (run) => !livingRuns(runs).includes(run));
    return {
      database,
      schemaName: (what) => `${schemaPrefix}_${process.pid}_${what}`,
      leave: () => leave(database, runs, folder),
    };
  } finally {
    lock.release();
  }
}

async function leave(database: Database, runs: string, folder: string): Promise<void> {
  await dropSchemas(database, (run) => run === process.pid);
  rmSync(path.join(runs, `${process.pid}.json`), { force: true });
  await stopUnusedTestServer(folder);
}

/** Stops the server unless a living run needs it: a run that was killed could not. */
export async function stopUnusedTestServer(folder = path.join(localFolder(), "test")): Promise<void> {
  const runs = path.join(folder, "runs");
  if (!existsSync(runs)) return;
  const lock = await waitForLock(path.join(folder, "joining.lock"));
  try {
    if (livingRuns(runs).length === 0) await stopDatabase(path.join(folder, "database"));
  } finally {
    lock.release();
  }
}

/** Process numbers of the runs that still need the server; notes of dead ones are cleared away. */
function livingRuns(runs: string): number[] {
  return readdirSync(runs).flatMap((name) => {
    const file = path.join(runs, name);
    const run = JSON.parse(readFileSync(file, "utf8"));
    if (isAlive(run)) return [run.pid];
    rmSync(file, { force: true });
    return [];
  });
}

async function dropSchemas(database: Database, isGone: (run: number) => boolean): Promise<void> {
  const found = await askAsAdmin(database.folder.socket, `SHOW DATABASES LIKE '${schemaPrefix}\\_%';`);
  const gone = found.split("\n").filter((name) => name !== "" && isGone(Number(name.split("_")[2])));
  await askAsAdmin(database.folder.socket, gone.map((name) => `DROP DATABASE \`${name}\`;`).join("\n"));
}
