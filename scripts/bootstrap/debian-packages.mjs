import { accessSync, constants } from "node:fs";
import path from "node:path";
import { runCommand } from "./run-command.mjs";
import { say } from "./say.mjs";
import { StopSentence } from "./stop-sentence.mjs";

/** What is needed, and a program that tells that it is there. */
const packages = {
  "mariadb-server": ["mariadbd", "mariadb-install-db", "mariadb"],
  chromium: ["chromium"],
};

/** Where programs are looked for: /usr/sbin holds the server, and is not on an ordinary user's PATH. */
function programFolders() {
  const always = ["/usr/sbin", "/usr/bin", "/usr/local/sbin", "/usr/local/bin"];
  return [...(process.env.PATH ?? "").split(":").filter(Boolean), ...always];
}

/**
 * @param {string} program
 * @returns {string | undefined} its path
 */
export function findProgram(program, folders = programFolders()) {
  return folders.map((folder) => path.join(folder, program)).find(isExecutable);
}

/** @param {string} file */
function isExecutable(file) {
  try {
    accessSync(file, constants.X_OK);
    return true;
  } catch {
    return false;
  }
}

/**
 * Installs the Debian packages that are missing; without the right to, says which.
 * @param {(keyof typeof packages)[]} names
 */
export async function installDebianPackages(
  names,
  folders = programFolders(),
  isRoot = process.getuid?.() === 0,
) {
  const missing = findMissing(names, folders);
  if (missing.length === 0) return;
  const apt = findProgram("apt-get", folders);
  if (!isRoot || !apt) {
    const noun = missing.length > 1 ? "packages" : "package";
    throw new StopSentence(
      `Cotterpin needs the Debian ${noun} ${missing.join(" and ")}: run "sudo apt-get install ${missing.join(" ")}" and start again.`,
    );
  }
  say(`Installing ${missing.join(" and ")} with apt-get, which may take a minute or two`);
  await install(apt, missing);
  const still = findMissing(names, folders);
  if (still.length === 0) return;
  throw new StopSentence(
    `Installing ${still.join(" and ")} did not work: run "apt-get install ${still.join(" ")}" by hand to see why.`,
  );
}

/**
 * @param {(keyof typeof packages)[]} names
 * @param {string[]} folders
 */
function findMissing(names, folders) {
  return names.filter((name) => packages[name].some((program) => !findProgram(program, folders)));
}

/**
 * @param {string} apt
 * @param {string[]} missing
 */
async function install(apt, missing) {
  const env = { ...process.env, DEBIAN_FRONTEND: "noninteractive" };
  // An earlier installation may have been cut short.
  await runCommand("dpkg", ["--configure", "-a"], { env, output: "quiet" });
  const lock = ["-o", "DPkg::Lock::Timeout=120"];
  await runCommand(apt, ["update", ...lock], { env, output: "quiet" });
  const parameters = ["install", "--yes", "--no-install-recommends", ...lock, ...missing];
  const { code, output } = await runCommand(apt, parameters, { env, output: "quiet" });
  if (code !== 0) console.error(output.trim().split("\n").slice(-8).join("\n"));
}
