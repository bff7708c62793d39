import {
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  writeFileSync,
} from "node:fs";
import { cpus, tmpdir, totalmem } from "node:os";
import path from "node:path";
import { projectRoot } from "./bootstrap/project-root.mjs";
import { runCommand } from "./bootstrap/run-command.mjs";

/** @typedef {{ name: string, value: number, unit: string, target?: { least?: number, most?: number }, note?: string }} Figure */

const HOW = "Write: npm run bench -- [name of a measurement ...] [--json file]";
const folder = path.join(projectRoot, "tests/bench");
const { names, json } = readWords(process.argv.slice(2));
const files = readdirSync(folder)
  .filter((file) => file.endsWith(".bench.ts"))
  .filter((file) => names.length === 0 || names.some((name) => file.includes(name)));
if (files.length === 0) {
  console.error(`There is no such measurement in tests/bench. ${HOW}`);
  process.exitCode = 1;
} else await measureAll();

/** @param {string[]} words */
function readWords(words) {
  const at = words.indexOf("--json");
  const local = process.env.COTTERPIN_LOCAL ?? path.join(projectRoot, ".local");
  const moment = new Date().toISOString().slice(0, 19).replaceAll(":", "");
  if (at < 0) return { names: words, json: path.join(local, "bench", `${moment}.json`) };
  if (words[at + 1] === undefined) throw new Error(`--json wants the name of a file. ${HOW}`);
  return { names: words.toSpliced(at, 2), json: path.resolve(words[at + 1]) };
}

/** Runs each measurement in a process of its own, then says and writes what they found. */
async function measureAll() {
  const scratch = mkdtempSync(path.join(tmpdir(), "cotterpin-bench-"));
  /** @type {Figure[]} */
  const figures = [];
  try {
    for (const file of files) {
      console.error(`Measuring ${file.replace(".bench.ts", "")}`);
      const out = path.join(scratch, `${file}.json`);
      const env = { ...process.env, BENCH_FIGURES: out };
      const words = ["--import", "tsx", path.join(folder, file)];
      const { code, output } = await runCommand(process.execPath, words, { env, output: "quiet" });
      if (code === 0 && existsSync(out)) figures.push(...JSON.parse(readFileSync(out, "utf8")));
      else {
        console.error(output);
        process.exitCode = 1;
      }
    }
  } finally {
    rmSync(scratch, { recursive: true, force: true });
  }
  sayTable(figures);
  const machine = {
    processor: cpus()[0]?.model ?? "",
    cores: cpus().length,
    memory: totalmem(),
    node: process.version,
  };
  mkdirSync(path.dirname(json), { recursive: true });
  const found = figures.map((figure) => ({ ...figure, met: isMet(figure) }));
  writeFileSync(
    json,
    `${JSON.stringify({ measuredAt: new Date().toISOString(), machine, figures: found }, null, 2)}\n`,
  );
  console.log(`\nWritten to ${json}`);
}

/** @param {Figure} figure */
function isMet({ value, target }) {
  if (!target) return null;
  return (
    value >= (target.least ?? Number.NEGATIVE_INFINITY) && value <= (target.most ?? Number.POSITIVE_INFINITY)
  );
}

/** @param {Figure[]} figures */
function sayTable(figures) {
  const rows = figures.map((figure) => {
    const { name, value, unit, target, note } = figure;
    const wanted =
      target?.least !== undefined ? `at least ${target.least}` : target ? `at most ${target.most}` : "";
    const met = isMet(figure);
    return [
      name,
      `${Number(value.toPrecision(3))} ${unit}`,
      wanted,
      met === null ? "" : met ? "met" : "MISSED",
      note ?? "",
    ];
  });
  const head = ["Figure", "Found", "Wanted", "", ""];
  const widths = head.map((_, column) => Math.max(...[head, ...rows].map((row) => row[column].length)));
  for (const row of [head, ...rows])
    console.log(
      row
        .map((cell, at) => cell.padEnd(widths[at]))
        .join("  ")
        .trimEnd(),
    );
}
