import { DatabaseError } from "sequelize";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { sequelize } from "~/db/client.server";
import { useTestDatabase } from "../../support/database";
import { expectSoundLedger } from "./expect-sound-ledger";
import { buildBin, buildPart, newKey, post, receive, usable } from "./stock-builders";

const database = useTestDatabase();

interface Statement {
  connection: { destroy(): void };
  options: { transaction?: unknown };
  run(sql: string, parameters?: unknown): Promise<unknown>;
}
const Query = (sequelize as unknown as { dialect: { Query: { prototype: Statement } } }).dialect.Query;

const databaseFault = (errno: number, code: string) =>
  new DatabaseError(Object.assign(new Error(code), { errno, code, sql: "" }));

/** What goes wrong, and whether the transaction is done again. */
const FAULTS = {
  "deadlock (1213)": { make: () => databaseFault(1213, "ER_LOCK_DEADLOCK"), after: false, again: true },
  "lock wait (1205)": { make: () => databaseFault(1205, "ER_LOCK_WAIT_TIMEOUT"), after: false, again: true },
  "changed record (1020)": { make: () => databaseFault(1020, "ER_CHECKREAD"), after: false, again: true },
  "connection lost before": {
    make: () => databaseFault(45009, "ER_SOCKET_UNEXPECTED_CLOSE"),
    after: false,
    again: true,
  },
  "connection lost after": {
    make: () => databaseFault(45009, "ER_SOCKET_UNEXPECTED_CLOSE"),
    after: true,
    again: true,
  },
  "a fault of our own": { make: () => new TypeError("a fault"), after: false, again: false },
} as const;

/** Lets the nth statement of a transaction go wrong, once, below everything of ours. */
function breakStatement(nth: number, fault: (typeof FAULTS)[keyof typeof FAULTS]) {
  let count = 0;
  const plain = Query.prototype.run;
  return vi.spyOn(Query.prototype, "run").mockImplementation(async function (
    this: Statement,
    sql,
    parameters,
  ) {
    if (!this.options.transaction || /^ROLLBACK/.test(sql) || ++count !== nth)
      return plain.call(this, sql, parameters);
    if (fault.after) await plain.call(this, sql, parameters);
    const error = fault.make();
    if (error.message.startsWith("ER_SOCKET")) this.connection.destroy();
    throw error;
  });
}

const receipt = () => [
  { ...receive("HB-2041", "5", "A12"), lot: "L7" },
  {
    kind: "move" as const,
    partNumber: "HB-2041",
    quantity: "2",
    lot: "L7",
    from: usable("A12"),
    to: usable("A21"),
  },
];

/** A lock wait at the key itself means that the first request still runs; the client comes back with the same key. */
async function postUntilTold(key: string) {
  try {
    return await post(receipt(), key);
  } catch (error) {
    if ((error as { code?: string }).code !== "conflict") throw error;
    return await post(receipt(), key);
  }
}

async function countStatements(): Promise<number> {
  const spy = breakStatement(-1, FAULTS["a fault of our own"]);
  await post([{ ...receive("HB-2041", "1", "A12"), lot: "L0" }]);
  const count = spy.mock.contexts.filter((context) => (context as Statement).options.transaction).length;
  spy.mockRestore();
  return count;
}

describe("a posting whose nth statement fails", () => {
  beforeEach(async () => {
    await buildPart("HB-2041");
    await buildBin("A12");
    await buildBin("A21");
    vi.spyOn(Math, "random").mockReturnValue(0);
    vi.spyOn(console, "warn").mockImplementation(() => undefined);
  });
  afterEach(async () => {
    vi.restoreAllMocks();
    await expectSoundLedger();
  });

  it.each(Object.keys(FAULTS) as (keyof typeof FAULTS)[])(
    "is whole or nothing after %s",
    { timeout: 90_000 },
    async (name) => {
      const statements = await countStatements();
      expect(statements).toBeGreaterThan(12);
      let whole = 0;
      for (let nth = 1; nth <= statements; nth++) {
        const spy = breakStatement(nth, FAULTS[name]);
        const answer = await postUntilTold(newKey()).catch((error: unknown) => error);
        spy.mockRestore();
        const done = !(answer instanceof Error);
        expect({ nth, done }).toEqual({ nth, done: FAULTS[name].again });
        whole += done ? 1 : 0;
        const [{ movements }] = await database.query("SELECT COUNT(*) AS movements FROM movement");
        expect(movements).toBe(1 + 2 * whole);
        await expectSoundLedger();
      }
    },
  );
});
