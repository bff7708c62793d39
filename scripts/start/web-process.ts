import { type ChildProcess, spawn } from "node:child_process";
import path from "node:path";
import { projectRoot } from "../bootstrap/project-root.mjs";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import { markServed } from "../build/serving-marks";

export interface WebProcess {
  pid: number | undefined;
  /** It listens. */
  ready: Promise<void>;
  /** Ends when the process does. */
  ended: Promise<number>;
  /** TERM, so that requests end well; after `patience` milliseconds it is killed. */
  stop(patience?: number): Promise<void>;
}

/** Serves a build. */
export function startWebProcess(build: string, env: NodeJS.ProcessEnv): WebProcess {
  const web = launch([path.join(build, "serve.js")], { NODE_ENV: "production", ...env }, "ipc");
  markServed(build, web.pid);
  return web;
}

/** Serves the sources as they are, and again whenever they change. */
export function startDevelopmentServer(host: string, port: number, env: NodeJS.ProcessEnv): WebProcess {
  const words = [
    "node_modules/@react-router/dev/bin.js",
    "dev",
    "--host",
    host,
    "--port",
    String(port),
    "--strictPort",
  ];
  return launch(words, { NODE_ENV: "development", ...env }, "ignore");
}

function launch(words: string[], env: NodeJS.ProcessEnv, channel: "ipc" | "ignore"): WebProcess {
  const child = spawn(process.execPath, words, {
    cwd: projectRoot,
    env: { ...process.env, ...env },
    // A group of its own: at the terminal, the starter alone hears Ctrl-C.
    detached: true,
    stdio: ["ignore", "inherit", "inherit", channel],
  });
  const ended = new Promise<number>((resolve) => {
    child.once("error", () => resolve(1));
    child.once("exit", (code) => resolve(code ?? 1));
  });
  const ready = channel === "ipc" ? hearsReady(child, ended) : Promise.resolve();
  ready.catch(() => {});
  return { pid: child.pid, ready, ended, stop: (patience = 7_500) => stop(child, ended, patience) };
}

async function stop(child: ChildProcess, ended: Promise<number>, patience: number): Promise<void> {
  if (child.exitCode !== null || child.signalCode !== null) return;
  const timer = setTimeout(() => child.kill("SIGKILL"), patience);
  child.kill("SIGTERM");
  await ended;
  clearTimeout(timer);
}

async function hearsReady(child: ChildProcess, ended: Promise<number>): Promise<void> {
  const code = await Promise.race([
    new Promise<void>((resolve) => child.once("message", () => resolve())),
    ended,
  ]);
  if (code !== undefined)
    throw new StopSentence("The web process ended before it was ready; the line above says why.");
}
