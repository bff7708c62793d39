import { mkdtempSync, rmSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { onTestFinished } from "vitest";

/** A folder with a space in its path, gone when the test is over. */
export function temporaryFolder(): string {
  const folder = mkdtempSync(path.join(os.tmpdir(), "cotterpin start "));
  onTestFinished(() => rmSync(folder, { recursive: true, force: true }));
  return folder;
}
