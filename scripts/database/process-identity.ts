import { readFileSync } from "node:fs";

/** A process by its number and its birth, since numbers are given out again. */
export interface ProcessIdentity {
  pid: number;
  /** Clock ticks since boot, from the kernel. */
  born: string;
}

export function identify(pid: number): ProcessIdentity | undefined {
  try {
    // The name in parentheses may hold spaces; what follows it does not.
    const fields = readFileSync(`/proc/${pid}/stat`, "utf8")
      .replace(/^.*\) /s, "")
      .split(" ");
    return fields[0] === "Z" ? undefined : { pid, born: fields[19] };
  } catch {
    return undefined;
  }
}

export function isAlive({ pid, born }: ProcessIdentity): boolean {
  return identify(pid)?.born === born;
}
