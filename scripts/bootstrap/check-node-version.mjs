import { StopSentence } from "./stop-sentence.mjs";

/** Node 20.12 is the first with all that the scripts use. */
const needed = [20, 12];

/** @param {string} version as `process.versions.node` has it */
export function checkNodeVersion(version = process.versions.node) {
  const [major, minor] = version.split(".").map(Number);
  if (major > needed[0] || (major === needed[0] && minor >= needed[1])) return;
  throw new StopSentence(
    `Cotterpin needs Node.js ${needed.join(".")} or newer, and this is ${version}: install a newer one and start again.`,
  );
}
