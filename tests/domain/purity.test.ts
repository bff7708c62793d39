import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { expect, test } from "vitest";

/** What would make an answer depend on more than what is asked. Imports are the import table's business. */
const impure: [what: string, pattern: RegExp][] = [
  ["clock", /\bDate\.now\b|\bnew Date\(\s*\)|\bDate\(\s*\)|\bperformance\b/],
  ["random", /\bMath\.random\b|\bcrypto\b/],
  ["environment", /\bprocess\b|\bimport\.meta\b|\bglobalThis\b/],
  ["timers", /\bset(Timeout|Interval|Immediate)\b|\bqueueMicrotask\b/],
  ["network", /\bfetch\(/],
];

function impurities(text: string): string[] {
  const code = text.replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, "").replace(/"(?:[^"\\\n]|\\.)*"/g, '""');
  return impure.filter(([, pattern]) => pattern.test(code)).map(([what]) => what);
}

test("the domain reads no clock, no chance, no environment", () => {
  const folder = path.join(import.meta.dirname, "../../app/domain");
  const files = readdirSync(folder, { recursive: true, encoding: "utf8" }).filter((name) =>
    name.endsWith(".ts"),
  );
  expect(files.length).toBeGreaterThan(10);
  const found = files.map((file) => [file, ...impurities(readFileSync(path.join(folder, file), "utf8"))]);
  expect(found.filter((each) => each.length > 1)).toEqual([]);
});

test.for([
  ["const now = Date.now();", "clock"],
  ["const now = new Date();", "clock"],
  ["const chance = Math.random();", "random"],
  ["const name = process.env.NAME;", "environment"],
  ["setTimeout(run, 1);", "timers"],
])("it sees through %s", ([text, what]) => {
  expect(impurities(text)).toEqual([what]);
});

test("words in comments and texts are no offence", () => {
  expect(
    impurities(
      '// the process goes on\nconst text = "process"; const day = new Date(Date.UTC(2026, 11, 1));',
    ),
  ).toEqual([]);
});
