import { runCommand } from "./bootstrap/run-command.mjs";

/** @typedef {{ name: string, words: string[], env?: NodeJS.ProcessEnv }} Step */

const bin = "node_modules";

/** The others read what it writes. @type {Step} */
const first = { name: "route types", words: [`${bin}/@react-router/dev/bin.js`, "typegen"] };

/** Side by side, each line one after the other: as many lines as the smallest machine has cores. @type {Step[][]} */
const lines = [
  [
    {
      name: "types",
      words: [
        `${bin}/typescript/bin/tsc`,
        "--noEmit",
        "--incremental",
        "--tsBuildInfoFile",
        "node_modules/.cache/types.tsbuildinfo",
      ],
    },
  ],
  [
    { name: "lint and format", words: [`${bin}/@biomejs/biome/bin/biome`, "check", "--error-on-warnings"] },
    {
      name: "imports",
      words: [
        `${bin}/dependency-cruiser/bin/dependency-cruise.mjs`,
        "--config",
        ".dependency-cruiser.cjs",
        "app",
        "scripts",
      ],
    },
    { name: "unused", words: [`${bin}/knip/bin/knip.js`, "--config", ".knip.json", "--no-progress"] },
    {
      name: "domain tests",
      words: [
        `${bin}/vitest/vitest.mjs`,
        "run",
        "--config",
        "tests/vitest.config.ts",
        "tests/domain",
        "tests/published",
        "--passWithNoTests",
      ],
    },
  ],
];

/** @param {Step} step */
async function take({ name, words }) {
  const begun = Date.now();
  const { code, output } = await runCommand(process.execPath, words, { output: "quiet" });
  const seconds = ((Date.now() - begun) / 1000).toFixed(1).padStart(5);
  console.log(`${seconds} s  ${name}: ${code === 0 ? "in order" : "FAULTY"}`);
  if (code !== 0) console.log(output.trim());
  return code === 0;
}

const beginning = await take(first);
const rest = await Promise.all(
  lines.map(async (steps) => {
    const line = [];
    for (const step of steps) line.push(await take(step));
    return line;
  }),
);
const results = [beginning, ...rest.flat()];
const faulty = results.filter((inOrder) => !inOrder).length;
console.log(faulty === 0 ? "All in order." : `${faulty} of ${results.length} checks failed.`);
process.exitCode = faulty === 0 ? 0 : 1;
