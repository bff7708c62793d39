import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import type { DatabaseFolder } from "./database-folder";

/** The passwords of the two database users. */
export interface Credentials {
  migratePassword: string;
  appPassword: string;
}

export const migrateUser = "cotterpin_migrate";
export const appUser = "cotterpin_app";

/** Reads the passwords, or makes them; the file is for its owner's eyes only. */
export function readOrMakeCredentials(folder: DatabaseFolder): Credentials {
  if (existsSync(folder.credentials)) return JSON.parse(readFileSync(folder.credentials, "utf8"));
  const made = { migratePassword: password(), appPassword: password() };
  const making = `${folder.credentials}.${process.pid}`;
  writeFileSync(making, `${JSON.stringify(made)}\n`, { mode: 0o600 });
  renameSync(making, folder.credentials);
  return made;
}

function password(): string {
  return randomBytes(24).toString("base64url");
}
