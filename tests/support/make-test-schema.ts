import { createSchema, type SchemaAddresses } from "../../scripts/database/create-schema";
import { runTypeScript } from "../../scripts/start/run-typescript";
import type { TestServer } from "../../scripts/test/test-server";

/** Makes a schema of this run and migrates it. */
export async function makeTestSchema(server: TestServer, what: string): Promise<SchemaAddresses> {
  const addresses = await createSchema(server.database, server.schemaName(what));
  const { code, output } = await runTypeScript("scripts/migrate.ts", { ...addresses });
  if (code !== 0) throw new Error(`The test schema could not be migrated:\n${output}`);
  return addresses;
}
