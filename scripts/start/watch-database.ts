import { say } from "../bootstrap/say.mjs";
import { isAlive } from "../database/process-identity";
import { type Database, restartDatabase } from "../database/start-database";

/**
 * Brings a database server that died back on its old port, so that the web process finds it again.
 * @returns a function that ends the watch
 */
export function watchDatabase(database: Database): () => Promise<void> {
  let server = database.server;
  let restarting: Promise<void> | undefined;
  const restart = async () => {
    say("The database ended unexpectedly and is started again");
    try {
      server = await restartDatabase(database.folder, server.port);
    } catch (error) {
      say(error instanceof Error ? error.message : "The database did not start again");
    }
    restarting = undefined;
  };
  const timer = setInterval(() => {
    if (!restarting && !isAlive(server)) restarting = restart();
  }, 500);
  return async () => {
    clearInterval(timer);
    await restarting;
  };
}
