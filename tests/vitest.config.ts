import { fileURLToPath } from "node:url";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL("..", import.meta.url));

/** Folders whose tests need no database. */
const pure = ["domain", "published", "schemas", "utils", "components", "hooks", "scripts", "start"].map(
  (folder) => `tests/${folder}/**/*.test.{ts,tsx}`,
);

export default defineConfig({
  root,
  cacheDir: "node_modules/.vite-tests",
  resolve: { tsconfigPaths: true },
  test: {
    // The machine that checks has two cores; each worker has a schema of its own.
    maxWorkers: 2,
    allowOnly: false,
    testTimeout: 20_000,
    hookTimeout: 60_000,
    setupFiles: ["tests/support/fail-on-console-error.ts"],
    projects: [
      { extends: true, test: { name: "pure", include: pure } },
      {
        extends: true,
        test: {
          name: "database",
          include: ["tests/**/*.test.{ts,tsx}"],
          exclude: [...pure, "tests/e2e/**", "tests/bench/**"],
          globalSetup: ["tests/support/database-global-setup.ts"],
          setupFiles: ["tests/support/database-environment.ts"],
        },
      },
    ],
  },
});
