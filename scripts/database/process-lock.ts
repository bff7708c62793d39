import { linkSync, readFileSync, renameSync, rmSync, writeFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { identify, isAlive, type ProcessIdentity } from "./process-identity";

export interface LockHolder extends ProcessIdentity {
  /** What the holder says about itself. */
  note?: string;
}

/**
 * Takes the lock, or tells who has it. It is a file that names a process, so a server started under it does not
 * inherit it, and one left by a process that is gone does not count.
 */
export function takeLock(
  file: string,
): { taken: true; note(text: string): void; release(): void } | { taken: false; holder: LockHolder } {
  const self = identify(process.pid) ?? { pid: process.pid, born: "" };
  const own = `${file}.${process.pid}`;
  for (;;) {
    writeFileSync(own, JSON.stringify(self), { mode: 0o600 });
    try {
      linkSync(own, file);
      rmSync(own);
      return {
        taken: true,
        note: (note) => writeNote(file, { ...self, note }),
        release: () => rmSync(file, { force: true }),
      };
    } catch (error) {
      rmSync(own, { force: true });
      if ((error as NodeJS.ErrnoException).code !== "EEXIST") throw error;
    }
    const holder = readHolder(file);
    if (holder && isAlive(holder)) return { taken: false, holder };
    rmSync(file, { force: true });
  }
}

/** Waits for the lock while another process has it. */
export async function waitForLock(file: string, patience = 60_000): Promise<{ release(): void }> {
  const until = Date.now() + patience;
  for (;;) {
    const lock = takeLock(file);
    if (lock.taken) return lock;
    if (Date.now() > until) throw new Error(`Process ${lock.holder.pid} holds ${file} for too long.`);
    await sleep(50);
  }
}

function writeNote(file: string, holder: LockHolder): void {
  const next = `${file}.next`;
  writeFileSync(next, JSON.stringify(holder), { mode: 0o600 });
  renameSync(next, file);
}

function readHolder(file: string): LockHolder | undefined {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch {
    return undefined;
  }
}
