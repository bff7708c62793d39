import type { TestProject } from "vitest/node";
import { createSchema, type SchemaAddresses } from "../../scripts/database/create-schema";
import { joinTestServer } from "../../scripts/test/test-server";
import { makeTestSchema } from "./make-test-schema";

/** What a worker is told about its schema. */
export interface WorkerSchema extends SchemaAddresses {
  /** Schema with a copy of the rows that the migrations themselves put in. */
  baseline: string;
}

declare module "vitest" {
  interface ProvidedContext {
    /** By worker number, from 1. */
    workerSchemas: Record<number, WorkerSchema>;
  }
}

/** Starts the tests' database server and makes a migrated schema for each worker. */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  const server = await joinTestServer();
  try {
    const numbers = Array.from(
      { length: Number(project.vitest.config.maxWorkers) || 1 },
      (_, index) => index + 1,
    );
    const schemas = await Promise.all(
      numbers.map(async (number) => {
        const addresses = await makeTestSchema(server, `${number}`);
        const baseline = server.schemaName(`${number}_baseline`);
        await createSchema(server.database, baseline);
        return [number, { ...addresses, baseline }] as const;
      }),
    );
    project.provide("workerSchemas", Object.fromEntries(schemas));
  } catch (error) {
    await server.leave();
    throw error;
  }
  return () => server.leave();
}
