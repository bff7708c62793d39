import { afterAll, inject } from "vitest";

const schema = inject("workerSchemas")[Number(process.env.VITEST_POOL_ID)];

// Set before any module of the application is read: each worker has its own schema.
process.env.DATABASE_URL = schema.DATABASE_URL;
process.env.DATABASE_MIGRATE_URL = schema.DATABASE_MIGRATE_URL;
process.env.SESSION_SECRET ??= "for-tests-only-for-tests-only-for-tests-only";

afterAll(async () => {
  await (globalThis as { __cotterpinClose?: () => Promise<void> }).__cotterpinClose?.();
});
