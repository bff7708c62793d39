import { spawn } from "node:child_process";
import { readdirSync, readFileSync } from "node:fs";
import { setTimeout as sleep } from "node:timers/promises";
import { onTestFinished } from "vitest";
import { projectRoot } from "../../scripts/bootstrap/project-root.mjs";
import { identify, isAlive, type ProcessIdentity } from "../../scripts/database/process-identity";

/** `npm start` as a process, with what it has said so far. */
export class StartedApplication {
  readonly #child;
  readonly ended: Promise<number | null>;
  said = "";

  constructor(env: NodeJS.ProcessEnv) {
    const { DATABASE_URL: _app, DATABASE_MIGRATE_URL: _migrate, ...rest } = process.env;
    this.#child = spawn(process.execPath, ["scripts/start.mjs"], {
      cwd: projectRoot,
      env: { ...rest, ...env },
      stdio: "pipe",
    });
    for (const stream of [this.#child.stdout, this.#child.stderr]) {
      stream.setEncoding("utf8").on("data", (text) => {
        this.said += text;
      });
    }
    this.ended = new Promise((resolve) => this.#child.on("close", resolve));
    onTestFinished(async () => {
      this.signal("SIGTERM");
      await this.ended;
    });
  }

  signal(signal: NodeJS.Signals): void {
    this.#child.kill(signal);
  }

  /** Waits until it has said something. */
  async says(text: string | RegExp, patience = 90_000): Promise<void> {
    const until = Date.now() + patience;
    while (!(typeof text === "string" ? this.said.includes(text) : text.test(this.said))) {
      if (Date.now() > until || this.#child.exitCode !== null)
        throw new Error(`It never said ${text}:\n${this.said}`);
      await sleep(20);
    }
  }

  /** All processes that it has started and those that these have started. */
  descendants(): ProcessIdentity[] {
    const parents = new Map(
      readdirSync("/proc")
        .filter((name) => /^\d+$/.test(name))
        .map((name) => [Number(name), parentOf(Number(name))]),
    );
    const isOurs = (pid: number | undefined): boolean =>
      pid === this.#child.pid || (!!pid && isOurs(parents.get(pid)));
    return [...parents.keys()]
      .filter((pid) => pid !== this.#child.pid && isOurs(pid))
      .flatMap((pid) => identify(pid) ?? []);
  }
}

function parentOf(pid: number): number {
  try {
    return Number(
      readFileSync(`/proc/${pid}/stat`, "utf8")
        .replace(/^.*\) /s, "")
        .split(" ")[1],
    );
  } catch {
    return 0;
  }
}

/** Those that still live. */
export function living(processes: ProcessIdentity[]): ProcessIdentity[] {
  return processes.filter(isAlive);
}
