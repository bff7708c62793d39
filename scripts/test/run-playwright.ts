import { readFileSync, rmSync } from "node:fs";
import { runCommand } from "../bootstrap/run-command.mjs";
import { type Tally, withCrash } from "./tally";

interface PlaywrightReport {
  stats: { expected: number; unexpected: number; flaky: number; skipped: number };
}

/** Runs the tests in the browser; their own set-up starts the application. */
export async function runPlaywright(reportFile: string): Promise<Tally> {
  rmSync(reportFile, { force: true });
  const words = [
    "node_modules/@playwright/test/cli.js",
    "test",
    "--config=tests/playwright.config.ts",
    "--reporter=list,json",
  ];
  const env = { ...process.env, PLAYWRIGHT_JSON_OUTPUT_NAME: reportFile };
  const { code } = await runCommand(process.execPath, words, { env });
  return withCrash(readReport(reportFile), code);
}

function readReport(file: string): Tally | undefined {
  try {
    const { stats }: PlaywrightReport = JSON.parse(readFileSync(file, "utf8"));
    return { passed: stats.expected, failed: stats.unexpected + stats.flaky, skipped: stats.skipped };
  } catch {
    return undefined;
  }
}
