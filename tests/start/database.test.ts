import { existsSync, mkdirSync, readdirSync, readFileSync, statSync, writeFileSync } from "node:fs";
import path from "node:path";
import { expect, onTestFinished, test } from "vitest";
import { askAsAdmin } from "../../scripts/database/ask-as-admin";
import { createSchema } from "../../scripts/database/create-schema";
import { databaseFolder } from "../../scripts/database/database-folder";
import { isAlive } from "../../scripts/database/process-identity";
import { takeLock } from "../../scripts/database/process-lock";
import { startDatabase } from "../../scripts/database/start-database";
import { stopDatabase } from "../../scripts/database/stop-database";
import { temporaryFolder } from "./temporary-folder";

async function start(folder: string) {
  onTestFinished(() => stopDatabase(folder));
  return startDatabase(folder, { durable: true });
}

test("a server starts in a path with a space, answers, is found again, and stops", async () => {
  const folder = path.join(temporaryFolder(), "data base");
  const database = await start(folder);
  const again = await startDatabase(folder, { durable: true });
  expect(again).toMatchObject({ found: true, server: database.server });

  const { DATABASE_URL } = await createSchema(database, "cotterpin");
  expect(DATABASE_URL).toMatch(/^mariadb:\/\/cotterpin_app:[\w-]{32}@127\.0\.0\.1:\d+\/cotterpin$/);
  expect(await createSchema(database, "cotterpin")).toMatchObject({ DATABASE_URL });
  expect(statSync(database.folder.credentials).mode & 0o777).toBe(0o600);
  expect(statSync(folder).mode & 0o777).toBe(0o700);

  await stopDatabase(folder);
  expect(isAlive(database.server)).toBe(false);
});

test("the server keeps what it has acknowledged, and refuses what it must", async () => {
  const database = await start(temporaryFolder());
  const settings = [
    ...["innodb_flush_log_at_trx_commit", "sync_binlog", "binlog_format", "innodb_rollback_on_timeout"],
    ...["innodb_lock_wait_timeout", "idle_transaction_timeout", "local_infile", "character_set_server"],
    ...["time_zone", "bind_address", "skip_name_resolve"],
  ];
  const answer = await askAsAdmin(
    database.folder.socket,
    `SELECT ${settings.map((name) => `@@${name}`).join(", ")};`,
  );
  expect(answer.split("\t")).toEqual([
    "1",
    "1",
    "ROW",
    "1",
    "5",
    "15",
    "0",
    "utf8mb4",
    "+00:00",
    "127.0.0.1",
    "1",
  ]);
  expect(await askAsAdmin(database.folder.socket, "SELECT @@sql_mode;")).toContain("STRICT_ALL_TABLES");
});

test("a stale pid file is not trusted, and a half-made data folder is set aside", async () => {
  const folder = temporaryFolder();
  const { data, pidFile } = databaseFolder(folder);
  // A living process that is no server of this folder.
  writeFileSync(pidFile, `${process.pid}\n`);
  mkdirSync(path.join(data, "mysql"), { recursive: true });
  writeFileSync(path.join(data, "mysql", "something.ibd"), "worth keeping");
  mkdirSync(path.join(folder, "data.making-1", "mysql"), { recursive: true });

  const database = await start(folder);

  expect(database.found).toBe(false);
  expect(readFileSync(pidFile, "utf8").trim()).toBe(String(database.server.pid));
  const aside = readdirSync(folder).find((name) => name.startsWith("data.broken-"));
  expect(readFileSync(path.join(folder, String(aside), "mysql", "something.ibd"), "utf8")).toBe(
    "worth keeping",
  );
  expect(existsSync(path.join(folder, "data.making-1"))).toBe(false);
});

test("a path too long for a socket gets a short socket", () => {
  const folder = path.join(temporaryFolder(), "a-long-name".repeat(10));
  const { socket } = databaseFolder(folder);
  expect(Buffer.byteLength(socket)).toBeLessThanOrEqual(107);
  expect(socket).not.toContain("a-long-name");
});

test("a lock left by a process that is gone does not count", () => {
  const file = path.join(temporaryFolder(), "some.lock");
  writeFileSync(file, JSON.stringify({ pid: process.pid, born: "another birth" }));
  const lock = takeLock(file);
  expect(lock.taken).toBe(true);
  expect(takeLock(file)).toMatchObject({ taken: false, holder: { pid: process.pid } });
  if (lock.taken) lock.release();
  expect(existsSync(file)).toBe(false);
});
