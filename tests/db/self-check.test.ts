import { QueryTypes, Sequelize } from "sequelize";
import { describe, expect, it } from "vitest";
import { sequelize as application } from "~/db/client.server";
import { connectionOptions } from "~/db/connection-options";
import { assertDriverIsExact, type RawConnection } from "~/db/self-check.server";
import { useTestDatabase } from "../support/database";

const database = useTestDatabase();

/** Asks through a connection as the mapper makes it, with some of the driver's options changed. */
async function check(changes: object): Promise<void> {
  const options = connectionOptions(database.appUrl);
  const opened = new Sequelize({ ...options, dialectOptions: { ...options.dialectOptions, ...changes } });
  const { connectionManager } = opened;
  const connection = await connectionManager.getConnection({} as never);
  try {
    await assertDriverIsExact(connection as unknown as RawConnection);
  } finally {
    connectionManager.releaseConnection(connection);
    await opened.close();
  }
}

describe("assertDriverIsExact", () => {
  it("is content with the options of this release", async () => {
    await expect(check({})).resolves.toBeUndefined();
  });

  it.each([
    ["the mapper's own options", { supportBigNumbers: true, decimalAsNumber: undefined }, "exact decimal"],
    ["big integers as BigInt", { bigIntAsNumber: false }, "big integer"],
    ["decimals as numbers", { decimalAsNumber: true, checkNumberRange: false }, "exact decimal"],
  ])("refuses %s in one sentence", async (_what, changes, named) => {
    const refusal = new RegExp(`^The database driver changes values .*\\(.*${named}.*\\)[^.]*\\.$`);
    await expect(check(changes)).rejects.toThrow(refusal);
  });

  it("is asked by the application itself, whose driver keeps every digit", async () => {
    const [row] = await application.query<{ sum: string }>(
      "SELECT CAST('0.1' AS DECIMAL(20,6)) + CAST('99999999999999.2' AS DECIMAL(20,6)) AS sum",
      { type: QueryTypes.SELECT },
    );
    expect(row.sum).toBe("99999999999999.300000");
  });
});
