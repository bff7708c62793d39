import { DatabaseError, QueryTypes, type Transaction } from "sequelize";
import { afterEach, describe, expect, it, vi } from "vitest";
import { sequelize } from "~/db/client.server";
import { inTransaction } from "~/db/in-transaction.server";
import { AppError } from "~/utils/errors";
import { useTestDatabase } from "../support/database";

const database = useTestDatabase();
const insert = (code: string, transaction: Transaction) =>
  sequelize.query("INSERT INTO kit_option (code) VALUES (:code)", {
    replacements: { code },
    type: QueryTypes.INSERT,
    transaction,
  });
const options = async () =>
  (await database.query("SELECT code FROM kit_option ORDER BY code")).map((row) => row.code);
const deadlock = () =>
  new DatabaseError(Object.assign(new Error("deadlock"), { errno: 1213, code: "ER_LOCK_DEADLOCK", sql: "" }));

describe("inTransaction", () => {
  afterEach(() => vi.restoreAllMocks());

  it("reads what is committed, and keeps what it did", async () => {
    const isolation = await inTransaction(async (transaction) => {
      await insert("RADIO", transaction);
      const [row] = await sequelize.query<{ level: string }>("SELECT @@tx_isolation AS level", {
        type: QueryTypes.SELECT,
        transaction,
      });
      return row.level;
    });
    expect(isolation).toBe("READ-COMMITTED");
    expect(await options()).toEqual(["RADIO"]);
  });

  it("does not commit half where an error was swallowed", async () => {
    const work = inTransaction(async (transaction) => {
      await insert("RADIO", transaction);
      await insert("RADIO", transaction).catch(() => undefined);
    });
    await expect(work).rejects.toThrow();
    expect(await options()).toEqual([]);
  });

  it("sends no statement after one that failed, not even one that was waiting", async () => {
    const work = inTransaction(async (transaction) => {
      await Promise.allSettled(["RADIO", "RADIO", "COVER"].map((code) => insert(code, transaction)));
      await insert("TRAILER", transaction).catch(() => undefined);
    });
    await expect(work).rejects.toThrow();
    expect(await options()).toEqual([]);
  });

  it("does the whole again after a deadlock of two", async () => {
    await inTransaction(async (transaction) => {
      for (const code of ["A", "B"]) await insert(code, transaction);
    });
    let tries = 0;
    const change = (codes: string[]) =>
      inTransaction(async (transaction) => {
        tries++;
        for (const code of codes) {
          await sequelize.query(
            "UPDATE kit_option SET description = CONCAT(description, 'x') WHERE code = :code",
            {
              replacements: { code },
              transaction,
            },
          );
          await new Promise((resolve) => setTimeout(resolve, 50));
        }
      });
    await Promise.all([change(["A", "B"]), change(["B", "A"])]);
    expect(tries).toBeGreaterThan(2);
    expect(await database.query("SELECT DISTINCT description AS text FROM kit_option")).toEqual([
      { text: "xx" },
    ]);
  });

  it("says that it is busy after eight tries", async () => {
    vi.spyOn(Math, "random").mockReturnValue(0);
    const work = vi.fn(async () => {
      throw deadlock();
    });
    const fault = await inTransaction(work).catch((error: unknown) => error);
    expect(fault).toBeInstanceOf(AppError);
    expect(fault).toMatchObject({ code: "busy", retryAfter: 2 });
    expect(work).toHaveBeenCalledTimes(8);
  });

  it("hands on what another try cannot cure, at once", async () => {
    const work = vi.fn(async (transaction: Transaction) => {
      await insert("RADIO", transaction);
      throw new AppError("conflict", "No.");
    });
    await expect(inTransaction(work)).rejects.toMatchObject({ code: "conflict" });
    expect(work).toHaveBeenCalledTimes(1);
    expect(await options()).toEqual([]);
  });
});
