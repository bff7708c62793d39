import type { Env } from "~/utils/env";
import { say } from "../bootstrap/say.mjs";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import type { StopRequest } from "./stop-request";
import { startDevelopmentServer, startWebProcess, type WebProcess } from "./web-process";

interface Serving {
  /** Left out for the development server. */
  build: string | undefined;
  env: Env;
  /** Environment of the web process, on top of our own. */
  settings: NodeJS.ProcessEnv;
  stop: StopRequest;
  whenReady: () => Promise<void>;
}

/** A web process that lived shorter would only end again. */
const shortLife = 10_000;

/** Keeps a web process until asked to stop; one that ends by itself is started again. */
export async function serve(serving: Serving): Promise<void> {
  const { stop, whenReady } = serving;
  let web: WebProcess | undefined;
  stop.before(async () => web?.stop());
  for (let first = true; !stop.isAsked; first = false) {
    const begun = Date.now();
    web = launch(serving);
    await web.ready;
    stop.code = 0;
    if (first) await whenReady();
    else say("The web process ended unexpectedly and was started again");
    await web.ended;
    if (!stop.isAsked && Date.now() - begun < shortLife) {
      throw new StopSentence("The web process ended unexpectedly; the lines above say why.");
    }
  }
}

function launch({ build, env, settings }: Serving): WebProcess {
  return build ? startWebProcess(build, settings) : startDevelopmentServer(env.host, env.port, settings);
}
