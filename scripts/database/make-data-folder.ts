import { existsSync, readdirSync, renameSync, rmSync, writeFileSync } from "node:fs";
import os from "node:os";
import path from "node:path";
import { findProgram } from "../bootstrap/debian-packages.mjs";
import { runCommand } from "../bootstrap/run-command.mjs";
import { say } from "../bootstrap/say.mjs";
import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import type { DatabaseFolder } from "./database-folder";

/** What a whole data folder has in it. */
const marks = ["mysql", "ibdata1", "aria_log_control"];

/**
 * Makes the data folder beside its place and renames it when it is whole, so that what stands there is whole. Whatever
 * else stands there is set aside, never deleted.
 */
export async function makeDataFolder(folder: DatabaseFolder): Promise<void> {
  const name = path.basename(folder.data);
  for (const left of readdirSync(folder.folder).filter((entry) => entry.startsWith(`${name}.making`))) {
    rmSync(path.join(folder.folder, left), { recursive: true, force: true });
  }
  if (existsSync(folder.data)) {
    if (marks.every((mark) => existsSync(path.join(folder.data, mark)))) return;
    setAside(folder.data);
  }
  const making = `${folder.data}.making-${process.pid}`;
  const log = path.join(folder.folder, "install.log");
  if (!(await install(making, log))) {
    say("Making the database did not work at the first try; trying once more");
    if (!(await install(making, log))) {
      throw new StopSentence(
        `The database could not be made: ${log} says why. Start again once that is mended.`,
      );
    }
  }
  renameSync(making, folder.data);
}

function setAside(data: string): void {
  if (readdirSync(data).length === 0) {
    rmSync(data, { recursive: true });
    return;
  }
  const aside = `${data}.broken-${new Date().toISOString().replace(/\D/g, "").slice(0, 14)}`;
  renameSync(data, aside);
  say(`The database folder was not whole; it is kept as ${aside}, and a new one is made`);
}

/** One try; false leaves nothing behind but what the installer said. */
async function install(data: string, log: string): Promise<boolean> {
  const program = findProgram("mariadb-install-db");
  if (!program)
    throw new StopSentence(
      "The program mariadb-install-db is missing: install the Debian package mariadb-server and start again.",
    );
  const user = os.userInfo().username;
  // The installer is a shell script that stumbles over some paths: it is given a relative one.
  const { code, output } = await runCommand(
    program,
    [
      "--no-defaults",
      `--user=${user}`,
      `--datadir=./${path.basename(data)}`,
      "--auth-root-authentication-method=socket",
      `--auth-root-socket-user=${user}`,
      "--skip-test-db",
    ],
    {
      output: "quiet",
      cwd: path.dirname(data),
      env: { ...process.env, PATH: `${process.env.PATH}:/usr/sbin:/sbin` },
    },
  );
  if (code === 0) return true;
  writeFileSync(log, output);
  rmSync(data, { recursive: true, force: true });
  return false;
}
