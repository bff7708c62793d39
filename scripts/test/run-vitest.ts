import { readFileSync, rmSync } from "node:fs";
import { runCommand } from "../bootstrap/run-command.mjs";
import { type Tally, withCrash } from "./tally";

interface VitestReport {
  numPassedTests: number;
  numFailedTests: number;
  numPendingTests: number;
  numTodoTests: number;
  testResults: { status: string; assertionResults: unknown[] }[];
}

/** Runs everything but the browser; `filters` narrow it down to files. */
export async function runVitest(reportFile: string, filters: string[]): Promise<Tally> {
  rmSync(reportFile, { force: true });
  const { code } = await runCommand(process.execPath, [
    "node_modules/vitest/vitest.mjs",
    "run",
    "--config=tests/vitest.config.ts",
    "--reporter=default",
    "--reporter=json",
    `--outputFile.json=${reportFile}`,
    ...filters,
  ]);
  return withCrash(readReport(reportFile), code);
}

function readReport(file: string): Tally | undefined {
  try {
    const report: VitestReport = JSON.parse(readFileSync(file, "utf8"));
    // A file that broke before its first test has none to count.
    const broken = report.testResults.filter(
      (each) => each.status === "failed" && each.assertionResults.length === 0,
    );
    return {
      passed: report.numPassedTests,
      failed: report.numFailedTests + broken.length,
      skipped: report.numPendingTests + report.numTodoTests,
    };
  } catch {
    return undefined;
  }
}
