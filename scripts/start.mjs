import { withSetUp } from "./bootstrap/with-set-up.mjs";

await withSetUp({
  // With a database of their own, people need no server here.
  debian: process.env.DATABASE_URL ? [] : ["mariadb-server"],
  main: async () => {
    const { runStart } = await import("./start/run-start.ts");
    return runStart({ dev: process.argv.includes("--dev") });
  },
});
