import { readFileSync } from "node:fs";
import path from "node:path";
import { projectRoot } from "./project-root.mjs";
import { runCommand } from "./run-command.mjs";
import { say } from "./say.mjs";
import { StopSentence } from "./stop-sentence.mjs";

/** Runs `npm ci` unless what package-lock.json asks for is already there. */
export async function installNodePackages(root = projectRoot) {
  if (nodePackagesAreThere(root)) return;
  say("Installing the node packages, which may take half a minute");
  const env = { ...process.env, PLAYWRIGHT_SKIP_BROWSER_DOWNLOAD: "1" };
  const parameters = ["ci", "--include=dev", "--no-audit", "--no-fund", "--loglevel=error"];
  const { code, output } = await runCommand("npm", parameters, { env, cwd: root, output: "quiet" });
  if (code === 0) return;
  console.error(output.trim().split("\n").slice(-8).join("\n"));
  throw new StopSentence('The node packages could not be installed: run "npm ci" by hand to see why.');
}

/** npm writes its own record into node_modules last of all, so a record that agrees means a whole installation. */
export function nodePackagesAreThere(root = projectRoot) {
  const wanted = readPackages(path.join(root, "package-lock.json"));
  const present = readPackages(path.join(root, "node_modules", ".package-lock.json"));
  if (!wanted || !present) return false;
  return Object.entries(wanted).every(([name, { version, optional }]) => {
    if (name === "") return true;
    return present[name] ? present[name].version === version : optional === true;
  });
}

/**
 * @param {string} file
 * @returns {Record<string, { version?: string, optional?: boolean }> | undefined}
 */
function readPackages(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8")).packages;
  } catch {
    return undefined;
  }
}
