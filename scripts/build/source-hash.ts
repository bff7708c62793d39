import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, statSync } from "node:fs";
import path from "node:path";
import { projectRoot } from "../bootstrap/project-root.mjs";

/** Everything that the built application is made of. */
const sources = [
  "app",
  "public",
  "scripts/serve.ts",
  "scripts/build",
  "react-router.config.ts",
  "vite.config.ts",
  "tsconfig.json",
  "package-lock.json",
];

/** The same for the same sources, whatever their dates. */
export function sourceHash(root = projectRoot): string {
  const hash = createHash("sha256").update(process.versions.node.split(".")[0]);
  for (const file of sources.flatMap((source) => filesUnder(root, source))) {
    hash.update(`\0${file}\0`).update(readFileSync(path.join(root, file)));
  }
  return hash.digest("hex").slice(0, 16);
}

function filesUnder(root: string, entry: string): string[] {
  const full = path.join(root, entry);
  if (!existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [entry];
  return readdirSync(full)
    .sort()
    .flatMap((name) => filesUnder(root, `${entry}/${name}`));
}
