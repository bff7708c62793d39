import { existsSync, rmSync, writeFileSync } from "node:fs";
import path from "node:path";
import mariadb from "mariadb";
import { say } from "../bootstrap/say.mjs";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import type { SchemaAddresses } from "../database/create-schema";
import { runTypeScript } from "./run-typescript";

interface Preparation {
  addresses: SchemaAddresses;
  local: string;
  demo: boolean;
  /** Empties the schema; given only where the schema is ours alone. */
  empty?: () => Promise<void>;
}

/** Migrates, and puts the demo firm into an empty database. A demo that was cut short is made anew. */
export async function prepareSchema({ addresses, local, demo, empty }: Preparation): Promise<void> {
  const seeding = path.join(local, "seeding");
  if (empty && existsSync(seeding)) {
    say("The demo firm was only half there; it is cleared away");
    await empty();
  }
  await run("scripts/migrate.ts", "Preparing the database", addresses);
  if (!demo || !(await isEmpty(addresses.DATABASE_MIGRATE_URL))) return rmSync(seeding, { force: true });
  writeFileSync(seeding, "");
  await run("scripts/seed.ts", "Putting in the demo firm", addresses);
  rmSync(seeding, { force: true });
}

async function run(script: string, what: string, addresses: SchemaAddresses): Promise<void> {
  say(what);
  // Its lines begin with seconds of its own.
  const pass = (line: string) =>
    /^\s*[\d.]+ s\s/.test(line) && say(`  ${line.replace(/^\s*[\d.]+ s\s+/, "")}`);
  const { code, output } = await runTypeScript(script, { ...addresses }, pass);
  if (code === 0) return;
  throw new StopSentence(`${what} did not work: ${output.trim().split("\n").slice(-12).join("\n")}`);
}

/** Nobody and nothing in it yet. */
async function isEmpty(address: string): Promise<boolean> {
  const connection = await mariadb.createConnection(address.replace(/^mysql:/, "mariadb:"));
  try {
    const [row] = await connection.query(
      "SELECT EXISTS(SELECT 1 FROM part) OR EXISTS(SELECT 1 FROM person) AS used",
    );
    return Number(row.used) === 0;
  } finally {
    await connection.end();
  }
}
