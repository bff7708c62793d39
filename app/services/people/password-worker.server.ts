import { createRequire } from "node:module";
import { Worker } from "node:worker_threads";
import { AppError } from "~/utils/errors";

type Task =
  | { act: "hash"; password: string; cost: number }
  | { act: "compare"; password: string; hash: string };
type Answer = { id: number; value: string | boolean } | { id: number; fault: string };

interface Waiting {
  resolve(value: string | boolean): void;
  reject(error: Error): void;
}

/** The thread's own text, since it has to run the same from source, from the bundle and in tests. */
const THREAD = `
const { parentPort, workerData } = require("node:worker_threads");
const loaded = require(workerData.bcrypt);
const bcrypt = loaded.default ?? loaded;
parentPort.on("message", ({ id, task }) => {
  try {
    const value = task.act === "hash" ? bcrypt.hashSync(task.password, task.cost) : bcrypt.compareSync(task.password, task.hash);
    parentPort.postMessage({ id, value });
  } catch (error) {
    parentPort.postMessage({ id, fault: String(error && error.message) });
  }
});
`;

/** More than this many at once would keep people waiting for a minute. */
const MOST_WAITING = 60;

let worker: Worker | undefined;
let lastId = 0;
const waiting = new Map<number, Waiting>();

function thread(): Worker {
  if (worker) return worker;
  const bcrypt = createRequire(import.meta.url).resolve("bcryptjs");
  const started = new Worker(THREAD, { eval: true, workerData: { bcrypt } });
  started.on("message", settle);
  started.on("error", (error) => fail(started, error));
  started.on("exit", () => fail(started, new Error("The password thread ended.")));
  worker = started;
  return started;
}

function settle(answer: Answer): void {
  const asker = waiting.get(answer.id);
  waiting.delete(answer.id);
  if (waiting.size === 0) worker?.unref();
  if ("fault" in answer) asker?.reject(new Error(answer.fault));
  else asker?.resolve(answer.value);
}

function fail(ended: Worker, error: Error): void {
  if (worker !== ended) return;
  worker = undefined;
  for (const asker of waiting.values()) asker.reject(error);
  waiting.clear();
}

/**
 * Runs one bcrypt computation off the main thread, which it would block for half a second.
 * @throws AppError `busy` when too many wait already
 */
export function runInPasswordThread(task: Task): Promise<string | boolean> {
  if (waiting.size >= MOST_WAITING) {
    throw new AppError("busy", "Many people are signing in just now. Try again in a moment.", {
      retryAfter: 10,
    });
  }
  const id = ++lastId;
  const answer = new Promise<string | boolean>((resolve, reject) => waiting.set(id, { resolve, reject }));
  const running = thread();
  running.ref();
  running.postMessage({ id, task });
  return answer;
}
