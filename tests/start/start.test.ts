import net from "node:net";
import path from "node:path";
import { expect, onTestFinished, test } from "vitest";
import { buildApplication } from "../../scripts/build/build-application";
import { databaseFolder } from "../../scripts/database/database-folder";
import { findFreePort } from "../../scripts/database/find-free-port";
import { findRunningServer } from "../../scripts/database/find-running-server";
import { living, StartedApplication } from "./started-application";
import { temporaryFolder } from "./temporary-folder";

async function settings() {
  const local = path.join(temporaryFolder(), "local");
  return {
    COTTERPIN_LOCAL: local,
    PORT: String(await findFreePort()),
    HOST: "127.0.0.1",
    COTTERPIN_DEMO: "0",
    PUBLIC_URL: "",
  };
}

const answers = async (port: string) => (await fetch(`http://127.0.0.1:${port}/api/health`)).status;

test("it starts, says no to a second one, survives a dead database, stops all, and starts again", async () => {
  await buildApplication();
  const env = await settings();
  const first = new StartedApplication(env);
  await first.says("Ctrl-C stops it.");
  expect(first.said).toContain(`Cotterpin is at http://127.0.0.1:${env.PORT}`);
  expect(first.said).toMatch(/one-time code \S+/);
  expect(await answers(env.PORT)).toBe(200);

  const second = new StartedApplication({ ...env, PORT: String(await findFreePort()) });
  expect(await second.ended).toBe(1);
  expect(second.said).toMatch(
    /^Cotterpin already runs from this folder at http:\/\/127\.0\.0\.1:\d+ \(process \d+\): .+\.\n$/,
  );

  const database = findRunningServer(databaseFolder(path.join(env.COTTERPIN_LOCAL, "database")));
  process.kill(Number(database?.pid), "SIGKILL");
  await first.says("The database ended unexpectedly and is started again");
  await expect.poll(() => answers(env.PORT), { timeout: 15_000 }).toBe(200);

  const started = first.descendants();
  expect(started.length).toBeGreaterThanOrEqual(2);
  const begun = Date.now();
  first.signal("SIGTERM");
  expect(await first.ended).toBe(0);
  expect(Date.now() - begun).toBeLessThan(10_000);
  expect(living(started)).toEqual([]);

  const third = new StartedApplication(env);
  await third.says("Ctrl-C stops it.");
  third.signal("SIGINT");
  expect(await third.ended).toBe(0);
}, 120_000);

test.for(["Starting the database", "Preparing the database"])(
  "TERM while it says %s leaves nothing behind",
  async (moment) => {
    const env = await settings();
    const application = new StartedApplication(env);
    await application.says(moment);
    const started = application.descendants();
    application.signal("SIGTERM");
    expect(await application.ended).toBe(143);
    expect(living(started)).toEqual([]);
    expect(findRunningServer(databaseFolder(path.join(env.COTTERPIN_LOCAL, "database")))).toBeUndefined();
  },
);

test("a taken port is one sentence", async () => {
  const env = await settings();
  const other = net.createServer().listen(Number(env.PORT), "127.0.0.1");
  onTestFinished(() => {
    other.close();
  });
  const application = new StartedApplication(env);
  expect(await application.ended).toBe(1);
  expect(application.said).toMatch(
    /^Port \d+ on 127\.0\.0\.1 is taken by another program: choose another, for example PORT=\d+ npm start\.\n$/,
  );
});

test("a setting that cannot be used is one sentence", async () => {
  const application = new StartedApplication({ ...(await settings()), PORT: "eighty" });
  expect(await application.ended).toBe(1);
  expect(application.said).toMatch(/^The environment cannot be used; correct PORT \(.+\)\.\n$/);
});
