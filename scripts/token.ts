import { parseArgs } from "node:util";
import { roleSchema } from "~/schemas/people/role";
import { findDatabaseUrl } from "./database/find-database-url";

const usage = 'Write: npm run --silent token -- --role manager [--name "What it is for"]';

async function main(): Promise<void> {
  const { values } = parseArgs({ options: { role: { type: "string" }, name: { type: "string" } } });
  const role = roleSchema.safeParse(values.role);
  if (!role.success) throw new Error(`${role.error.issues[0].message} ${usage}`);
  process.env.DATABASE_URL = findDatabaseUrl();
  // Read only now, since it opens the database that the environment names.
  const { createToken } = await import("~/services/people/create-token.server");
  const { closeDatabase } = await import("~/db/client.server");
  try {
    console.log(
      await createToken({ role: role.data, name: values.name?.slice(0, 120) || `${role.data} token` }),
    );
  } finally {
    await closeDatabase();
  }
}

main().catch((error: Error & { code?: string }) => {
  const isOurs = error.name === "Error" && !error.message.includes("\n");
  if (error.code?.startsWith("ERR_PARSE_ARGS")) console.error(`${error.message.split("\n")[0]} ${usage}`);
  else
    console.error(
      isOurs
        ? error.message
        : "The database did not answer, so no token was made. Start with npm start, then try again.",
    );
  process.exitCode = 1;
});
