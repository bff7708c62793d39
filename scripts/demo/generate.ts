import { mkdirSync, writeFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { demoFiles } from "./demo-files";

const folder = process.argv[2] ?? fileURLToPath(new URL("../../data/demo/", import.meta.url));
mkdirSync(folder, { recursive: true });
for (const [name, text] of demoFiles()) {
  writeFileSync(`${folder}/${name}`, text);
  process.stdout.write(`${name}: ${text.split("\n").length - 2} rows\n`);
}
