import path from "node:path";
import { type Env, readEnv } from "~/utils/env";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import { buildApplication } from "../build/build-application";
import { takeLock } from "../database/process-lock";
import { assertPortFree } from "./assert-port-free";
import { localFolder } from "./local-folder";
import { readOrMakeSessionSecret } from "./local-secret";
import { openDatabase } from "./open-database";
import { prepareSchema } from "./prepare-schema";
import { sayWelcome } from "./say-welcome";
import { serve } from "./serve-until-stopped";
import { StopRequest } from "./stop-request";

/** From the set-up to the end of the application; gives the exit code. */
export async function runStart({ dev }: { dev: boolean }): Promise<number> {
  const env = readSettings();
  const local = localFolder();
  const lock = takeLock(path.join(local, "start.lock"));
  if (!lock.taken) {
    const where = lock.holder.note ? ` at ${lock.holder.note}` : "";
    throw new StopSentence(
      `Cotterpin already runs from this folder${where} (process ${lock.holder.pid}): stop that one first, or give this one its own COTTERPIN_LOCAL and PORT.`,
    );
  }
  const stop = new StopRequest();
  stop.before(async () => lock.release());
  return stop.guard(async () => {
    await assertPortFree(env.host, env.port);
    const { addresses, empty } = await openDatabase(local, stop);
    await prepareSchema({ addresses, local, demo: env.demo, empty });
    const listening = `http://${env.host.includes(":") ? `[${env.host}]` : env.host}:${env.port}`;
    const address = env.publicUrl ?? listening;
    const settings = {
      ...addresses,
      COTTERPIN_LOCAL: local,
      SESSION_SECRET: env.sessionSecret ?? readOrMakeSessionSecret(local),
    };
    const whenReady = async () => {
      lock.note(address);
      await sayWelcome({ address, local: listening, demo: env.demo, env: settings });
    };
    await serve({ build: dev ? undefined : await buildApplication(), env, settings, stop, whenReady });
  });
}

function readSettings(): Env {
  try {
    return readEnv();
  } catch (error) {
    throw new StopSentence(error instanceof Error ? error.message : String(error));
  }
}
