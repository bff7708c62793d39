import { spawnSync } from "node:child_process";
import { copyFileSync, mkdirSync, symlinkSync, writeFileSync } from "node:fs";
import path from "node:path";
import { expect, test } from "vitest";
import { projectRoot } from "../../scripts/bootstrap/project-root.mjs";
import { temporaryFolder } from "./temporary-folder";

/** Files that keep to the table. */
const good: Record<string, string> = {
  "app/routes.ts": 'export default ["routes/check/page.tsx", "routes/find/page.tsx"];',
  "app/root.tsx": 'import "~/components/shell"; export const root = 1;',
  "app/domain/sum.ts": "export const sum = 1; export type Sum = number;",
  "app/domain/total.ts": 'import { sum } from "./sum"; export const total = sum;',
  "app/schemas/part.ts":
    'import { z } from "zod"; import { sum } from "~/domain/sum"; export const part = [z, sum];',
  "app/utils/env.ts": 'import path from "node:path"; export const env = path;',
  "app/db/client.ts":
    'import "sequelize"; import type { Sum } from "~/domain/sum"; import "~/utils/env"; export const client: Sum = 1;',
  "app/services/check.ts":
    'import "~/db/client"; import "~/schemas/part"; import "~/domain/sum"; export const check = 1;',
  "app/components/shell.tsx": 'import "~/hooks/use-shell"; import "react"; export const shell = 1;',
  "app/hooks/use-shell.ts": 'import "~/schemas/part"; export const useShell = 1;',
  "app/routes/check/page.tsx": 'import "~/services/check"; import "./private-part"; export const page = 1;',
  "app/routes/check/private-part.tsx": "export const privatePart = 1;",
  "app/routes/find/page.tsx": "export const page = 1;",
  "scripts/seed.ts": 'import "~/services/check"; import "~/db/client"; export const seed = 1;',
  // The other half of a loop that is reported once, where it begins.
  "app/services/half-a-loop.ts": 'import { a } from "./bad-loop"; export const b = a;',
  "app/domain/type-loop-a.ts": 'import type { B } from "./type-loop-b"; export type A = B | 1;',
  "app/domain/type-loop-b.ts": 'import type { A } from "./type-loop-a"; export type B = A | 2;',
};

/** One offence each: file, what it holds, the rule that refuses it. */
const bad: [file: string, text: string, rule: string][] = [
  ["app/domain/bad-node.ts", 'import "node:fs";', "domain-row"],
  ["app/domain/bad-react.ts", 'import "react";', "domain-row"],
  ["app/domain/bad-sequelize.ts", 'import "sequelize";', "domain-row"],
  ["app/domain/bad-env.ts", 'import "~/utils/env";', "domain-row"],
  [
    "app/domain/bad-type.ts",
    'import type { client } from "~/db/client"; export type Bad = typeof client;',
    "domain-row",
  ],
  ["app/schemas/bad-utils.ts", 'import "~/utils/env";', "schemas-row"],
  ["app/schemas/bad-package.ts", 'import "react";', "schemas-row"],
  ["app/utils/bad-domain.ts", 'import "~/domain/sum";', "utils-row"],
  ["app/db/bad-value.ts", 'import { sum } from "~/domain/sum"; export const bad = sum;', "db-row"],
  ["app/db/bad-services.ts", 'import "~/services/check";', "db-row"],
  [
    "app/db/bad-type.ts",
    'import type { part } from "~/schemas/part"; export type Bad = typeof part;',
    "db-types-row",
  ],
  ["app/services/bad-routes.ts", 'import "~/routes/check/private-part";', "services-row"],
  ["app/services/bad-components.ts", 'import "~/components/shell";', "services-row"],
  ["app/components/bad-services.tsx", 'import "~/services/check";', "components-row"],
  ["app/components/bad-db.tsx", 'import "~/db/client";', "components-row"],
  ["app/components/bad-node.tsx", 'import "node:fs";', "browser-without-node"],
  ["app/hooks/bad-routes.ts", 'import "~/routes/check/private-part";', "hooks-row"],
  ["app/routes/check/bad-db.tsx", 'import "~/db/client";', "routes-row"],
  ["app/routes/check/bad-area.tsx", 'import "~/routes/find/page";', "routes-row"],
  ["app/routes/check/bad-route.tsx", 'import "./page";', "no-route-from-route"],
  ["app/bad-db.ts", 'import "~/db/client";', "root-row"],
  ["scripts/bad-routes.ts", 'import "~/routes/check/private-part";', "scripts-row"],
  ["scripts/bad-components.ts", 'import "~/components/shell";', "scripts-row"],
  ["app/services/bad-loop.ts", 'import { b } from "./half-a-loop"; export const a = b;', "no-cycle"],
  ["app/utils/bad-nowhere.ts", 'import "./nowhere";', "resolvable"],
];

interface Violation {
  from: string;
  rule: { name: string };
}

test("each import rule refuses its offence, and nothing that keeps to the table", () => {
  const root = temporaryFolder();
  for (const file of [".dependency-cruiser.cjs", "tsconfig.json"])
    copyFileSync(path.join(projectRoot, file), path.join(root, file));
  symlinkSync(path.join(projectRoot, "node_modules"), path.join(root, "node_modules"));
  for (const [file, text] of [...Object.entries(good), ...bad]) {
    mkdirSync(path.join(root, path.dirname(file)), { recursive: true });
    writeFileSync(path.join(root, file), text);
  }

  const program = path.join(projectRoot, "node_modules/dependency-cruiser/bin/dependency-cruise.mjs");
  const words = [program, "--config", ".dependency-cruiser.cjs", "--output-type", "json", "app", "scripts"];
  const { stdout, stderr } = spawnSync(process.execPath, words, {
    cwd: root,
    encoding: "utf8",
    maxBuffer: 2 ** 26,
  });
  expect(stderr).toBe("");
  const violations: Violation[] = JSON.parse(stdout).summary.violations;

  const found = violations.map(({ from, rule }) => `${rule.name}: ${from}`);
  expect(
    bad.map(([file, , rule]) => `${rule}: ${file}`).filter((offence) => !found.includes(offence)),
  ).toEqual([]);
  expect(violations.filter(({ from }) => from in good)).toEqual([]);
});
