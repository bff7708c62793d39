import { spawn } from "node:child_process";
import { projectRoot } from "./project-root.mjs";

/** @type {Set<import("node:child_process").ChildProcess>} */
const running = new Set();
let refusing = false;

/**
 * @typedef {object} CommandOptions
 * @property {NodeJS.ProcessEnv} [env]
 * @property {"inherit" | "quiet"} [output] quiet keeps the output and gives it back
 * @property {string} [cwd]
 * @property {(line: string) => void} [onLine] hears each line of standard output as it comes, where the output is quiet
 */

/**
 * Runs a command in a process group of its own, so that it can be ended with all that it started.
 * @param {string} command
 * @param {string[]} commandArguments
 * @param {CommandOptions} [options]
 * @returns {Promise<{ code: number, output: string, standardOutput: string }>} code is 127 where the command is not there
 */
export function runCommand(command, commandArguments, options = {}) {
  if (refusing) return Promise.resolve({ code: 143, output: "", standardOutput: "" });
  const quiet = options.output === "quiet";
  const child = spawn(command, commandArguments, {
    cwd: options.cwd ?? projectRoot,
    env: options.env ?? process.env,
    detached: true,
    stdio: ["ignore", quiet ? "pipe" : "inherit", quiet ? "pipe" : "inherit"],
  });
  running.add(child);
  let output = "";
  let standardOutput = "";
  child.stdout?.setEncoding("utf8").on("data", (text) => {
    const begun = standardOutput.lastIndexOf("\n") + 1;
    output += text;
    standardOutput += text;
    for (const line of standardOutput.slice(begun).split("\n").slice(0, -1)) options.onLine?.(line);
  });
  child.stderr?.setEncoding("utf8").on("data", (text) => {
    output += text;
  });
  return new Promise((resolve) => {
    /** @param {number} code */
    const end = (code) => {
      running.delete(child);
      resolve({ code, output, standardOutput });
    };
    child.on("error", () => end(127));
    child.on("close", (code) => end(code ?? 1));
  });
}

/** Ends every command that still runs, with its children, and lets none begin any more; those that do not listen are killed. */
export async function endCommands(patience = 3_000) {
  refusing = true;
  const ended = [...running].map((child) => new Promise((resolve) => child.once("close", resolve)));
  for (const child of running) signalGroup(child, "SIGTERM");
  const timer = setTimeout(() => {
    for (const child of running) signalGroup(child, "SIGKILL");
  }, patience);
  await Promise.all(ended);
  clearTimeout(timer);
}

/**
 * @param {import("node:child_process").ChildProcess} child
 * @param {NodeJS.Signals} signal
 */
function signalGroup(child, signal) {
  try {
    if (child.pid) process.kill(-child.pid, signal);
  } catch {
    // It ended by itself in the meantime.
  }
}
