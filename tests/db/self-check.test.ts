import { QueryTypes, Sequelize } from "sequelize";
import { afterEach, describe, expect, it } from "vitest";
import { sequelize as application } from "~/db/client.server";
import { connectionOptions } from "~/db/connection-options";
import { assertDriverIsExact, type RawConnection } from "~/db/self-check.server";
import { useTestDatabase } from "../support/database";

const database = useTestDatabase();
let opened: Sequelize | undefined;

/** A connection as the mapper makes it, with some of the driver's options changed. */
async function connect(changes: object): Promise<RawConnection> {
  const options = connectionOptions(database.appUrl);
  opened = new Sequelize({ ...options, dialectOptions: { ...options.dialectOptions, ...changes } });
  const manager = opened.connectionManager as unknown as { getConnection(): Promise<RawConnection> };
  return manager.getConnection();
}

describe("assertDriverIsExact", () => {
  afterEach(async () => {
    await opened?.close();
    opened = undefined;
  });

  it("is content with the options of this release", async () => {
    await expect(assertDriverIsExact(await connect({}))).resolves.toBeUndefined();
  });

  it.each([
    ["the mapper's own options", { supportBigNumbers: true, decimalAsNumber: undefined }, "exact decimal"],
    ["big integers as BigInt", { bigIntAsNumber: false }, "big integer"],
    ["decimals as numbers", { decimalAsNumber: true, checkNumberRange: false }, "exact decimal"],
  ])("refuses %s in one sentence", async (_what, changes, named) => {
    const connection = await connect(changes);
    const refusal = new RegExp(`^The database driver changes values .*\\(.*${named}.*\\)[^.]*\\.$`);
    await expect(assertDriverIsExact(connection)).rejects.toThrow(refusal);
  });

  it("is asked by the application itself, whose driver keeps every digit", async () => {
    const [row] = await application.query<{ sum: string }>(
      "SELECT CAST('0.1' AS DECIMAL(20,6)) + CAST('99999999999999.2' AS DECIMAL(20,6)) AS sum",
      { type: QueryTypes.SELECT },
    );
    expect(row.sum).toBe("99999999999999.300000");
  });
});
