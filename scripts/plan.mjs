import { checkNodeVersion } from "./bootstrap/check-node-version.mjs";
import { installNodePackages } from "./bootstrap/node-packages.mjs";
import { sayWhyItStops } from "./bootstrap/stop-sentence.mjs";

// Standard output belongs to the answer; progress of a first installation goes beside it.
console.log = console.error;

try {
  checkNodeVersion();
  await installNodePackages();
  const { register } = await import("tsx/esm/api");
  register();
  const { runPlan } = await import("./plan/run-plan.ts");
  const { stdout, stderr } = process;
  process.exitCode = await runPlan(process.argv.slice(2), { stdout, stderr, now: new Date() });
} catch (error) {
  sayWhyItStops(error);
  process.exitCode = 1;
}
