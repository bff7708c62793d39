import { beforeEach, describe, expect, it } from "vitest";
import { APPEND_ONLY_TABLES } from "~/db/append-only-tables";
import { sequelize } from "~/db/client.server";
import { buildBin, buildPart, post, receive } from "../services/stock/stock-builders";
import { useTestDatabase } from "../support/database";

const database = useTestDatabase();

const DENIED = 1142;

async function errorNumber(work: Promise<unknown>): Promise<number | undefined> {
  const error = await work.then(
    () => ({}),
    (fault: unknown) => fault as { errno?: number; parent?: { errno?: number } },
  );
  return "parent" in error ? error.parent?.errno : (error as { errno?: number }).errno;
}

describe("facts", () => {
  beforeEach(async () => {
    await buildPart("HB-2041");
    await buildBin("A12");
    await post([receive("HB-2041", "5", "A12")]);
  });

  it.each(APPEND_ONLY_TABLES)("of %s are not changed by the application", async (table) => {
    expect(await errorNumber(sequelize.query(`UPDATE ${table} SET id = id + 1`))).toBe(DENIED);
    expect(await errorNumber(sequelize.query(`DELETE FROM ${table}`))).toBe(DENIED);
    expect(await errorNumber(sequelize.query(`TRUNCATE TABLE ${table}`))).toBe(DENIED);
    expect(await errorNumber(sequelize.query(`DROP TABLE ${table}`))).toBe(DENIED);
  });

  it.each(APPEND_ONLY_TABLES)("of %s are not changed by the migrating user either", async (table) => {
    await expect(database.query(`UPDATE ${table} SET id = id + 1`)).rejects.toThrow(
      "never changed or deleted",
    );
    await expect(database.query(`DELETE FROM ${table}`)).rejects.toThrow("never changed or deleted");
  });

  it("are not undone by taking the triggers or the record of migrations away", async () => {
    expect(await errorNumber(sequelize.query("DROP TRIGGER movement_refuse_update"))).toBe(DENIED);
    expect(await errorNumber(sequelize.query("DELETE FROM migration"))).toBe(DENIED);
  });

  it("cannot be stored twice under one number of a balance", async () => {
    const copy =
      "INSERT INTO movement_leg SELECT NULL, movement_id, part_id, lot_id, bin_id, place, state, quantity, sequence FROM movement_leg WHERE place = 'bin'";
    expect(await errorNumber(database.query(copy))).toBe(1062);
  });
});

describe("balances", () => {
  it("are never negative, whoever writes them", async () => {
    await buildPart("HB-2041");
    await buildBin("A12");
    await post([receive("HB-2041", "5", "A12")]);
    expect(await errorNumber(database.query("UPDATE balance SET quantity = quantity - 6"))).toBe(4025);
  });
});
