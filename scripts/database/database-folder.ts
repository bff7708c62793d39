import { createHash } from "node:crypto";
import { lstatSync, mkdirSync } from "node:fs";
import os from "node:os";
import path from "node:path";

/** Where one database server keeps its things. */
export interface DatabaseFolder {
  folder: string;
  data: string;
  socket: string;
  pidFile: string;
  log: string;
  credentials: string;
  lock: string;
}

/** The kernel takes no longer socket path, counted in bytes. */
const socketPathLimit = 107;

export function databaseFolder(folder: string): DatabaseFolder {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  return {
    folder,
    data: path.join(folder, "data"),
    socket: socketPath(folder),
    pidFile: path.join(folder, "mariadb.pid"),
    log: path.join(folder, "mariadb.log"),
    credentials: path.join(folder, "credentials.json"),
    lock: path.join(folder, "starting.lock"),
  };
}

function socketPath(folder: string): string {
  const wanted = path.join(folder, "mariadb.sock");
  if (Buffer.byteLength(wanted) <= socketPathLimit) return wanted;
  const name = createHash("sha256").update(folder).digest("hex").slice(0, 16);
  const short = path.join(os.tmpdir(), `cotterpin-${name}`);
  mkdirSync(short, { recursive: true, mode: 0o700 });
  const found = lstatSync(short);
  if (!found.isDirectory() || found.uid !== process.getuid?.()) {
    throw new Error(
      `The folder ${short} belongs to somebody else, so the database socket cannot be put there.`,
    );
  }
  return path.join(short, "mariadb.sock");
}
