import { checkNodeVersion } from "./bootstrap/check-node-version.mjs";
import { installNodePackages } from "./bootstrap/node-packages.mjs";
import { sayWhyItStops } from "./bootstrap/stop-sentence.mjs";

/** Puts the node packages in where they are missing. */
try {
  checkNodeVersion();
  await installNodePackages();
} catch (error) {
  sayWhyItStops(error);
  process.exitCode = 1;
}
