import { checkNodeVersion } from "./check-node-version.mjs";
import { installDebianPackages } from "./debian-packages.mjs";
import { installNodePackages } from "./node-packages.mjs";
import { projectRoot } from "./project-root.mjs";
import { endCommands } from "./run-command.mjs";
import { sayWhyItStops } from "./stop-sentence.mjs";

/**
 * Everything that must be there before TypeScript can run, then the rest of the command.
 * @param {{ debian: ("mariadb-server" | "chromium")[], main: () => Promise<number> }} options main gives the exit code
 */
export async function withSetUp({ debian, main }) {
  let stopping = false;
  const stop = async () => {
    stopping = true;
    await endCommands();
    process.exit(143);
  };
  process.on("SIGTERM", stop).on("SIGINT", stop);
  try {
    process.chdir(projectRoot);
    checkNodeVersion();
    await installDebianPackages(debian);
    await installNodePackages();
    const { register } = await import("tsx/esm/api");
    register();
    process.off("SIGTERM", stop).off("SIGINT", stop);
    process.exitCode = await main();
  } catch (error) {
    // What goes wrong because it is being stopped is no news.
    if (!stopping) sayWhyItStops(error);
    process.exitCode = 1;
  }
}
