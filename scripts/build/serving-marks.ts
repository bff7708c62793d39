import { readdirSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { identify, isAlive, type ProcessIdentity } from "../database/process-identity";

const prefix = "served-by-";

/** Notes in the build's folder that the process serves it, so that it is kept for as long as the process lives. */
export function markServed(build: string, pid: number | undefined): void {
  const identity = pid === undefined ? undefined : identify(pid);
  if (identity) writeFileSync(path.join(build, `${prefix}${identity.pid}`), JSON.stringify(identity));
}

/** Whether some living process serves the build. */
export function isServed(build: string): boolean {
  return readdirSync(build)
    .filter((name) => name.startsWith(prefix))
    .some((name) => isAlive(JSON.parse(readFileSync(path.join(build, name), "utf8")) as ProcessIdentity));
}
