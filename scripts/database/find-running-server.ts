import { readFileSync } from "node:fs";
import type { DatabaseFolder } from "./database-folder";
import { identify, type ProcessIdentity } from "./process-identity";

export interface RunningServer extends ProcessIdentity {
  port: number;
}

/** The server of this data folder, if one runs. A pid file alone proves nothing: the process must name our folder. */
export function findRunningServer(folder: DatabaseFolder): RunningServer | undefined {
  try {
    const pid = Number(readFileSync(folder.pidFile, "utf8").trim());
    return asServerOf(folder, pid);
  } catch {
    return undefined;
  }
}

/** The process, if it is a server of this data folder. */
export function asServerOf(folder: DatabaseFolder, pid: number): RunningServer | undefined {
  const process = identify(pid);
  if (!process) return undefined;
  const words = readFileSync(`/proc/${pid}/cmdline`, "utf8").split("\0");
  const port = words.find((word) => word.startsWith("--port="))?.slice("--port=".length);
  return port && words.includes(`--datadir=${folder.data}`) ? { ...process, port: Number(port) } : undefined;
}
