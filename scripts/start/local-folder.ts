import { mkdirSync } from "node:fs";
import path from "node:path";
import { projectRoot } from "../bootstrap/project-root.mjs";

/** The folder of everything that belongs to this machine alone; made where it is missing. */
export function localFolder(): string {
  const folder = path.resolve(projectRoot, process.env.COTTERPIN_LOCAL || ".local");
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  return folder;
}
