import { existsSync } from "node:fs";
import { projectRoot } from "./bootstrap/project-root.mjs";

if (existsSync(`${projectRoot}/node_modules/tsx`)) {
  const { register } = await import("tsx/esm/api");
  register({ tsconfig: `${projectRoot}/tsconfig.json` });
  const { runPlan } = await import("./plan.ts");
  const { stdout, stderr } = process;
  process.exitCode = await runPlan(process.argv.slice(2), { stdout, stderr, now: new Date() });
} else {
  console.error("The node packages are missing: run npm ci or npm start first.");
  process.exitCode = 1;
}
