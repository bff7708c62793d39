import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { parse } from "csv-parse/sync";
import { checkPlanFiles } from "~/services/imports/files/check-plan-files";

const folder = new URL("../../data/demo/", import.meta.url);

const demoPath = (name: string) => fileURLToPath(new URL(name, folder));

export const demoText = (name: string) => readFileSync(demoPath(name), "utf8");

const read = new Map<string, Record<string, string>[]>();

/** The rows of a demo file, by column, read by another reader than the program's own. */
export function demoRows(name: string): Record<string, string>[] {
  const rows = read.get(name) ?? parse(demoText(name), { columns: true });
  read.set(name, rows);
  return rows;
}

/** The demo firm as the plan takes it. */
export function demoPlanInput() {
  const named = (name: string) => ({ name, bytes: readFileSync(demoPath(name)) });
  const input = checkPlanFiles({
    parts: named("parts.csv"),
    structure: named("structure.csv"),
    stock: named("stock.csv"),
    supply: named("supply.csv"),
  });
  if (!input.ok) throw new Error(JSON.stringify(input.problems.slice(0, 3)));
  return input;
}

/** Lines from the kit down to each part below it, the longest way; parts without a way are absent. */
export function depthsBelow(kit: string): Map<string, number> {
  const components = new Map<string, string[]>();
  for (const { parent, component } of demoRows("structure.csv")) {
    components.set(parent, [...(components.get(parent) ?? []), component]);
  }
  const depths = new Map([[kit, 0]]);
  let level = new Set([kit]);
  for (let depth = 1; level.size > 0; depth++) {
    level = new Set([...level].flatMap((parent) => components.get(parent) ?? []));
    for (const part of level) depths.set(part, depth);
  }
  return depths;
}
