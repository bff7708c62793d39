import { spawn } from "node:child_process";
import { closeSync, openSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { findProgram } from "../bootstrap/debian-packages.mjs";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import { askAsAdmin } from "./ask-as-admin";
import { type DatabaseFolder, databaseFolder } from "./database-folder";
import { findFreePort } from "./find-free-port";
import { asServerOf, findRunningServer, type RunningServer } from "./find-running-server";
import { makeDataFolder } from "./make-data-folder";
import { isAlive } from "./process-identity";
import { waitForLock } from "./process-lock";
import { serverArguments } from "./server-arguments";

export interface Database {
  folder: DatabaseFolder;
  server: RunningServer;
  /** A server of this folder ran already and is used. */
  found: boolean;
}

/** Starts the database server of a folder and waits until it answers; one that runs already is used as it is. */
export async function startDatabase(folderPath: string, options: { durable: boolean }): Promise<Database> {
  const folder = databaseFolder(folderPath);
  const lock = await waitForLock(folder.lock);
  try {
    const running = findRunningServer(folder);
    if (running) {
      await waitUntilItAnswers(folder, running);
      return { folder, server: running, found: true };
    }
    await makeDataFolder(folder);
    rmSync(folder.pidFile, { force: true });
    rmSync(folder.socket, { force: true });
    return { folder, server: await launch(folder, await findFreePort(), options.durable), found: false };
  } finally {
    lock.release();
  }
}

/** Starts a server that died again, on the port that its clients know. */
export function restartDatabase(folder: DatabaseFolder, port: number): Promise<RunningServer> {
  return launch(folder, port, true);
}

async function launch(folder: DatabaseFolder, port: number, durable: boolean): Promise<RunningServer> {
  const program = findProgram("mariadbd");
  if (!program)
    throw new StopSentence(
      "The program mariadbd is missing: install the Debian package mariadb-server and start again.",
    );
  const log = openSync(folder.log, "a", 0o600);
  // A group of its own: Ctrl-C at the terminal reaches the starter, which stops the server last.
  const child = spawn(program, serverArguments(folder, port, durable), {
    detached: true,
    stdio: ["ignore", log, log],
  });
  closeSync(log);
  child.on("error", () => {});
  child.unref();
  // The server writes it too, but later: whoever must stop it meanwhile finds it.
  writeFileSync(folder.pidFile, `${child.pid}\n`);
  const server = await appears(folder, child.pid ?? 0);
  await waitUntilItAnswers(folder, server);
  return server;
}

/** The forked process carries the server's command line a moment later. */
async function appears(folder: DatabaseFolder, pid: number): Promise<RunningServer> {
  for (let tries = 0; tries < 100; tries += 1) {
    const server = asServerOf(folder, pid);
    if (server) return server;
    await sleep(10);
  }
  throw didNotStart(folder);
}

async function waitUntilItAnswers(folder: DatabaseFolder, server: RunningServer): Promise<void> {
  const until = Date.now() + 60_000;
  while (Date.now() < until && isAlive(server)) {
    try {
      await askAsAdmin(folder.socket, "SELECT 1;");
      return;
    } catch {
      await sleep(50);
    }
  }
  throw didNotStart(folder);
}

function didNotStart(folder: DatabaseFolder): StopSentence {
  const lines = readFileSync(folder.log, "utf8").trim().split("\n");
  const reason = lines.filter((line) => line.includes("[ERROR]")).at(0) ?? lines.at(-1) ?? "";
  const text = reason.replace(/^.*\[ERROR\]\s*/, "").slice(0, 200);
  return new StopSentence(`The database did not start (${text}); its full log is ${folder.log}.`);
}
