import { runCommand } from "../bootstrap/run-command.mjs";

/** Runs one of the TypeScript commands in a process of its own, with `env` on top of this process's environment. */
export function runTypeScript(script: string, env: NodeJS.ProcessEnv, onLine?: (line: string) => void) {
  const options = { env: { ...process.env, ...env }, output: "quiet" as const, onLine };
  return runCommand(process.execPath, ["--import", "tsx", script], options);
}
