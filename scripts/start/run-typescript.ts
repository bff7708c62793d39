import { runCommand } from "../bootstrap/run-command.mjs";

/** Runs one of the TypeScript commands in a process of its own, with `env` on top of this process's environment. */
export function runTypeScript(script: string, env: NodeJS.ProcessEnv, output: "inherit" | "quiet" = "quiet") {
  const options = { env: { ...process.env, ...env }, output };
  return runCommand(process.execPath, ["--import", "tsx", script], options);
}
