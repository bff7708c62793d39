import { rmSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { databaseFolder } from "./database-folder";
import { findRunningServer } from "./find-running-server";
import { isAlive } from "./process-identity";

/** Stops the server of a folder, if one runs: politely, and after `patience` milliseconds at once (a commit is on the disk by then). */
export async function stopDatabase(folderPath: string, patience = 8_000): Promise<void> {
  const folder = databaseFolder(folderPath);
  const server = findRunningServer(folder);
  if (!server) return;
  process.kill(server.pid, "SIGTERM");
  const until = Date.now() + patience;
  while (isAlive(server)) {
    if (Date.now() > until) process.kill(server.pid, "SIGKILL");
    await sleep(25);
  }
  rmSync(folder.socket, { force: true });
  rmSync(folder.pidFile, { force: true });
}
