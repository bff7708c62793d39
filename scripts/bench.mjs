import { existsSync, readdirSync } from "node:fs";
import path from "node:path";
import { projectRoot } from "./bootstrap/project-root.mjs";
import { runCommand } from "./bootstrap/run-command.mjs";

/** Runs the measurements of tests/bench, or those whose names are given. */
const folder = path.join(projectRoot, "tests/bench");
const wanted = process.argv.slice(2);
const files = (existsSync(folder) ? readdirSync(folder) : []).filter(
  (file) => file.endsWith(".ts") && (wanted.length === 0 || wanted.some((name) => file.includes(name))),
);
if (files.length === 0) {
  console.error("There is no such measurement in tests/bench.");
  process.exitCode = 1;
}
for (const file of files) {
  const { code } = await runCommand(process.execPath, ["--import", "tsx", path.join(folder, file)]);
  if (code !== 0) process.exitCode = 1;
}
