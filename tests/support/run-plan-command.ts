import { spawn } from "node:child_process";
import { mkdtemp, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { Writable } from "node:stream";
import { runPlan } from "../../scripts/plan/run-plan";

export interface CommandResult {
  code: number | null;
  stdout: string;
  stderr: string;
}

/** Runs the command line in a process of its own, as a person does. */
export function runPlanCommand(parameters: readonly string[]): Promise<CommandResult> {
  return new Promise((resolve, reject) => {
    const child = spawn(process.execPath, ["scripts/plan.mjs", ...parameters], {
      stdio: ["ignore", "pipe", "pipe"],
    });
    let stdout = "";
    let stderr = "";
    child.stdout.setEncoding("utf8").on("data", (text) => {
      stdout += text;
    });
    child.stderr.setEncoding("utf8").on("data", (text) => {
      stderr += text;
    });
    child.on("error", reject).on("close", (code) => resolve({ code, stdout, stderr }));
  });
}

/** The same in this process, a hundred times faster. */
export async function runPlanHere(parameters: readonly string[]): Promise<CommandResult> {
  const said = { stdout: "", stderr: "" };
  const into = (name: keyof typeof said) =>
    new Writable({
      write(chunk, _, done) {
        said[name] += chunk;
        done();
      },
    });
  const around = { stdout: into("stdout"), stderr: into("stderr"), now: new Date("2026-12-01T12:00:00Z") };
  return { code: await runPlan(parameters, around), ...said };
}

export type Files = Record<string, string | Uint8Array>;

/** Puts files into a folder of their own for as long as `use` runs. */
export async function withFiles<Result>(
  files: Files,
  use: (folder: string) => Promise<Result>,
): Promise<Result> {
  const folder = await mkdtemp(path.join(tmpdir(), "cotterpin-plan-"));
  try {
    for (const [name, content] of Object.entries(files)) await writeFile(path.join(folder, name), content);
    return await use(folder);
  } finally {
    await rm(folder, { recursive: true });
  }
}
