import { mkdirSync } from "node:fs";
import path from "node:path";
import { buildApplication } from "../../scripts/build/build-application";
import { findFreePort } from "../../scripts/database/find-free-port";
import { localFolder } from "../../scripts/start/local-folder";
import { runTypeScript } from "../../scripts/start/run-typescript";
import { startWebProcess } from "../../scripts/start/web-process";
import { joinTestServer } from "../../scripts/test/test-server";
import { makeTestSchema } from "./make-test-schema";

/** Serves the built application with the demo firm in a schema of its own, at the address COTTERPIN_TEST_URL. */
export default async function setUp(): Promise<() => Promise<void>> {
  const server = await joinTestServer();
  try {
    const addresses = await makeTestSchema(server, "browser");
    const seeding = await runTypeScript("scripts/seed.ts", { ...addresses });
    if (seeding.code !== 0) throw new Error(`The demo firm could not be put in:\n${seeding.output}`);
    const port = await findFreePort();
    const local = path.join(localFolder(), "test", "browser");
    mkdirSync(local, { recursive: true, mode: 0o700 });
    const web = startWebProcess(await buildApplication(), {
      ...addresses,
      HOST: "127.0.0.1",
      PORT: String(port),
      COTTERPIN_LOCAL: local,
      COTTERPIN_DEMO: "1",
      PUBLIC_URL: "",
      SMTP_URL: "",
      SESSION_SECRET: "for-tests-only-for-tests-only-for-tests-only",
    });
    await web.ready;
    process.env.COTTERPIN_TEST_URL = `http://127.0.0.1:${port}`;
    return async () => {
      await web.stop();
      await server.leave();
    };
  } catch (error) {
    await server.leave();
    throw error;
  }
}
