import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { migrateDatabase } from "~/db/migrate.server";
import { ALL_MIGRATIONS } from "~/db/migrations/all-migrations";
import { createSchema, type SchemaAddresses } from "../../scripts/database/create-schema";
import { joinTestServer, type TestServer } from "../../scripts/test/test-server";

describe("migrateDatabase", () => {
  let server: TestServer;
  let addresses: SchemaAddresses;
  beforeAll(async () => {
    server = await joinTestServer();
    addresses = await createSchema(server.database, server.schemaName("migrate"));
  });
  afterAll(() => server.leave());

  it("goes up from nothing once, however many processes start together", async () => {
    const url = addresses.DATABASE_MIGRATE_URL;
    const ran = await Promise.all([1, 2, 3].map(() => migrateDatabase(url, "cotterpin_app")));
    const names = ALL_MIGRATIONS.map((migration) => migration.name);
    expect(ran.flat()).toEqual(names);
    expect(await migrateDatabase(url)).toEqual([]);
  });

  it("can run a step again that stopped half-way", async () => {
    const { Sequelize } = await import("sequelize");
    const sequelize = new Sequelize(addresses.DATABASE_MIGRATE_URL, { dialect: "mariadb", logging: false });
    await sequelize.query("DELETE FROM migration");
    await sequelize.close();
    expect(await migrateDatabase(addresses.DATABASE_MIGRATE_URL)).toHaveLength(ALL_MIGRATIONS.length);
  });

  it("refuses an application user that is not there", async () => {
    await expect(migrateDatabase(addresses.DATABASE_MIGRATE_URL, "nobody")).rejects.toThrow(
      "The database knows no user nobody",
    );
  });
});
