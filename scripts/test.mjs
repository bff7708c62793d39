import { withSetUp } from "./bootstrap/with-set-up.mjs";

await withSetUp({
  debian: ["mariadb-server", "chromium"],
  main: async () => {
    const { runTests } = await import("./test/run-tests.ts");
    return runTests(process.argv.slice(2));
  },
});
