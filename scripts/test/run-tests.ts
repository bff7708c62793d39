import { mkdirSync } from "node:fs";
import path from "node:path";
import { say } from "../bootstrap/say.mjs";
import { localFolder } from "../start/local-folder";
import { StopRequest } from "../start/stop-request";
import { runPlaywright } from "./run-playwright";
import { runVitest } from "./run-vitest";
import type { Tally } from "./tally";
import { stopUnusedTestServer } from "./test-server";

/**
 * Runs all tests, or with filters those files that vitest finds by them, and says the sum in the last line.
 * @returns the exit code
 */
export async function runTests(filters: string[]): Promise<number> {
  const reports = path.join(localFolder(), "test");
  mkdirSync(reports, { recursive: true, mode: 0o700 });
  const tallies: Tally[] = [];
  const stop = new StopRequest();
  stop.code = 0;
  stop.before(() => stopUnusedTestServer());
  await stop.guard(async () => {
    tallies.push(await runVitest(path.join(reports, "vitest.json"), filters));
    if (filters.length > 0) return;
    say("The tests in the browser");
    tallies.push(await runPlaywright(path.join(reports, "playwright.json")));
  });
  return stop.isAsked ? 143 : sum(tallies);
}

function sum(tallies: Tally[]): number {
  const of = (what: keyof Tally) => tallies.reduce((total, tally) => total + tally[what], 0);
  if (of("skipped") > 0) console.log(`${of("skipped")} tests were left out.`);
  console.log(`${of("passed")} passed, ${of("failed")} failed`);
  return of("failed") === 0 && of("passed") > 0 ? 0 : 1;
}
