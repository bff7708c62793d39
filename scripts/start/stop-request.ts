import { endCommands } from "../bootstrap/run-command.mjs";
import { say } from "../bootstrap/say.mjs";

/** Ctrl-C, TERM or a closed terminal, however often it comes, and what must be ended then. */
export class StopRequest {
  isAsked = false;
  /** The exit code of a stop that was asked for: 0 once the application has served. */
  code = 143;
  #ask: () => void = () => {};
  readonly #asked = new Promise<void>((resolve) => {
    this.#ask = resolve;
  });
  readonly #enders: (() => Promise<unknown>)[] = [];

  constructor() {
    this.#followNpm();
    for (const signal of ["SIGTERM", "SIGINT", "SIGHUP"] as const) process.on(signal, () => this.#hear());
  }

  /** Has `end` carried out before the program ends; the last one named goes first. */
  before(end: () => Promise<unknown>): void {
    this.#enders.unshift(end);
  }

  /**
   * Does the work until it ends, fails or is asked to stop, then ends all that was started.
   * @returns the exit code
   */
  async guard(work: () => Promise<void>): Promise<number> {
    const doing = work();
    // What goes wrong in the work because it is being stopped is no news.
    doing.catch(() => {});
    try {
      await Promise.race([doing, this.#asked]);
    } finally {
      await endCommands(1_000);
      for (const end of this.#enders) await end();
    }
    return this.code;
  }

  /** npm that is killed outright tells nobody: whoever it ran then has another parent. */
  #followNpm(): void {
    if (!process.env.npm_lifecycle_event) return;
    const parent = process.ppid;
    setInterval(() => process.ppid !== parent && this.#hear(), 500).unref();
  }

  #hear(): void {
    if (!this.isAsked) say("Stopping");
    this.isAsked = true;
    this.#ask();
  }
}
