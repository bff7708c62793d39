import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, renameSync, writeFileSync } from "node:fs";
import path from "node:path";

/** The session secret of this machine: made once, for its owner's eyes only. */
export function readOrMakeSessionSecret(local: string): string {
  const file = path.join(local, "session-secret");
  if (existsSync(file)) return readFileSync(file, "utf8").trim();
  const secret = randomBytes(32).toString("base64url");
  const making = `${file}.${process.pid}`;
  writeFileSync(making, `${secret}\n`, { mode: 0o600 });
  renameSync(making, file);
  return secret;
}
