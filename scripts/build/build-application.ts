import { existsSync, mkdirSync, readdirSync, rmSync, statSync, utimesSync, writeFileSync } from "node:fs";
import path from "node:path";
import { projectRoot } from "../bootstrap/project-root.mjs";
import { runCommand } from "../bootstrap/run-command.mjs";
import { say } from "../bootstrap/say.mjs";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import { waitForLock } from "../database/process-lock";
import { isServed } from "./serving-marks";
import { sourceHash } from "./source-hash";

/** As many builds are kept, and older ones that are still served. */
const kept = 4;

/**
 * Builds the application unless a build of the same sources is there.
 * @returns the folder with `serve.js`, `client/` and `server/`
 */
export async function buildApplication(): Promise<string> {
  const builds = path.join(projectRoot, "build");
  mkdirSync(builds, { recursive: true });
  const lock = await waitForLock(path.join(builds, "building.lock"), 180_000);
  try {
    const folder = path.join(builds, sourceHash());
    const complete = path.join(folder, "complete");
    if (existsSync(complete)) {
      utimesSync(folder, new Date(), new Date());
      return folder;
    }
    say("Building the application");
    await build(folder);
    writeFileSync(complete, "");
    removeOldBuilds(builds);
    return folder;
  } finally {
    lock.release();
  }
}

async function build(folder: string): Promise<void> {
  const env = { ...process.env, NODE_ENV: "production", COTTERPIN_BUILD: path.relative(projectRoot, folder) };
  const steps = [
    ["node_modules/@react-router/dev/bin.js", "build"],
    ["--import", "tsx", "scripts/build/build-server.ts", folder],
  ];
  for (const step of steps) {
    const { code, output } = await runCommand(process.execPath, step, { env, output: "quiet" });
    if (code === 0) continue;
    console.error(output.trim().split("\n").slice(-30).join("\n"));
    throw new StopSentence("The application could not be built; the lines above say why.");
  }
}

function removeOldBuilds(builds: string): void {
  const folders = readdirSync(builds)
    .map((name) => path.join(builds, name))
    .filter((folder) => existsSync(path.join(folder, "complete")))
    .sort((a, b) => statSync(b).mtimeMs - statSync(a).mtimeMs);
  for (const folder of folders.slice(kept)) {
    if (!isServed(folder)) rmSync(folder, { recursive: true, force: true });
  }
}
