import { closeDatabase } from "~/db/client.server";
import { makeSetupCode } from "~/services/people/make-setup-code.server";

/** Prints the one-time code for setting up an empty shop; prints nothing once there is a manager. */
try {
  const code = await makeSetupCode();
  if (code !== null) console.log(code);
} catch {
  console.error("The set-up code could not be made: the database did not answer.");
  process.exitCode = 1;
} finally {
  await closeDatabase();
}
