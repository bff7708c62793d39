const { readFileSync } = require("node:fs");
const path = require("node:path");

/**
 * Who may import what: the table of DEVELOPERS.md, a rule a row. A row holds for types too; what it does not name is
 * refused. tests/start/import-rules.test.ts plants a bad file for each rule.
 */

const ours = "^(app|scripts|tests)/";

/** Folders of app/ that a folder may import from, itself included. */
const rows = {
  utils: ["utils"],
  db: ["db", "utils"],
  services: ["services", "domain", "db", "schemas", "utils"],
  components: ["components", "hooks", "domain", "schemas", "utils"],
  hooks: ["components", "hooks", "domain", "schemas", "utils"],
};

const rowRules = Object.entries(rows).map(([folder, allowed]) => ({
  name: `${folder}-row`,
  comment: `app/${folder} may import ${allowed.join(", ")}.`,
  severity: "error",
  from: { path: `^app/${folder}/` },
  // The database's models may name the domain's types.
  to: {
    path: ours,
    pathNot: `^app/(${allowed.join("|")})/`,
    ...(folder === "db" ? { dependencyTypesNot: ["type-only"] } : {}),
  },
}));

/** The files that app/routes.ts names. */
const routeModules = [...readFileSync(path.join(__dirname, "app/routes.ts"), "utf8").matchAll(/"(routes\/[^"]+\.tsx?)"/g)]
  .map((match) => match[1].replace(/[.*+?^${}()|[\]\\]/g, "\\$&"))
  .join("|");

module.exports = {
  forbidden: [
    {
      name: "domain-row",
      comment: "app/domain is pure: it imports from app/domain alone, no package and nothing of Node.",
      severity: "error",
      from: { path: "^app/domain/" },
      to: { pathNot: "^app/domain/" },
    },
    {
      name: "schemas-row",
      comment: "app/schemas may import domain and zod.",
      severity: "error",
      from: { path: "^app/schemas/" },
      to: { pathNot: ["^app/(domain|schemas)/", "(^|/)node_modules/zod/"] },
    },
    ...rowRules,
    {
      name: "db-types-row",
      comment: "app/db may import types from domain, and from no other folder but utils.",
      severity: "error",
      from: { path: "^app/db/" },
      to: { path: ours, pathNot: "^app/(db|utils|domain)/" },
    },
    {
      name: "browser-without-node",
      comment: "Components and hooks run in the browser too: nothing of Node, no database.",
      severity: "error",
      from: { path: "^app/(components|hooks)/" },
      to: { dependencyTypes: ["core"] },
    },
    {
      name: "routes-row",
      comment: "app/routes may import services, components, hooks, schemas, domain, utils and the private parts beside it.",
      severity: "error",
      from: { path: "^app/routes/([^/]+/|[^/]+$)" },
      to: { path: ours, pathNot: ["^app/(services|components|hooks|schemas|domain|utils)/", "^app/routes/$1"] },
    },
    {
      name: "no-route-from-route",
      comment: "Nobody imports a route module: what two of them share is a component or a service.",
      severity: "error",
      from: { path: "^app/", pathNot: "^app/routes\\.ts$" },
      to: { path: `^app/(${routeModules || "-"})$` },
    },
    {
      name: "root-row",
      comment: "The files of app/ itself may import as routes may, and the error page.",
      severity: "error",
      from: { path: "^app/[^/]+$" },
      to: { path: ours, pathNot: "^app/([^/]+$|(services|components|hooks|schemas|domain|utils|routes)/)" },
    },
    {
      name: "scripts-row",
      comment: "scripts may import services, db, domain, schemas, utils.",
      severity: "error",
      from: { path: "^scripts/" },
      to: { path: ours, pathNot: ["^scripts/", "^app/(services|db|domain|schemas|utils)/"] },
    },
    {
      name: "no-cycle",
      comment: "No loop of value imports.",
      severity: "error",
      from: { path: ours },
      to: { circular: true, viaOnly: { dependencyTypesNot: ["type-only"] } },
    },
    {
      name: "resolvable",
      comment: "Every import leads to a file.",
      severity: "error",
      from: { path: ours },
      to: { couldNotResolve: true },
    },
  ],
  options: {
    doNotFollow: { path: "node_modules" },
    exclude: { path: "\\+types/|virtual:" },
    tsPreCompilationDeps: true,
    tsConfig: { fileName: "tsconfig.json" },
    enhancedResolveOptions: { exportsFields: ["exports"], conditionNames: ["import", "node", "default", "types"] },
  },
};
