import { beforeEach, describe, expect, test } from "vitest";
import { cancelKitOrder } from "~/services/kit-orders/cancel-kit-order.server";
import { createKitOrder } from "~/services/kit-orders/create-kit-order.server";
import { findKitOrders } from "~/services/kit-orders/find-kit-orders.server";
import { findKits } from "~/services/kit-orders/find-kits.server";
import { getKitOrder } from "~/services/kit-orders/get-kit-order.server";
import { updateKitOrder } from "~/services/kit-orders/update-kit-order.server";
import type { CurrentPerson } from "~/services/people/current-person";
import type { AppError } from "~/utils/errors";
import { useTestDatabase as testDatabase } from "../../support/database";

const database = testDatabase();

const planner: CurrentPerson = {
  id: null,
  name: "Idris Fenwick",
  email: null,
  roles: ["planner"],
  via: "token",
};
const clerk: CurrentPerson = { ...planner, name: "Wren Adlington", roles: ["clerk"] };

function order(overrides: Record<string, unknown> = {}) {
  return { kit: "S2", priority: "1", customer: "Saltings Ferry Trust", ...overrides };
}

async function failure(promise: Promise<unknown>): Promise<AppError> {
  return promise.then(
    () => expect.fail("It should have been refused."),
    (error: AppError) => error,
  );
}

async function revision(): Promise<number> {
  const [row] = await database.query("SELECT value FROM revision WHERE name = 'orders'");
  return Number(row.value);
}

beforeEach(async () => {
  await database.query(
    `INSERT INTO part (part_number, part_key, description, sourcing, unit, decimals, sold) VALUES
     ('S2', 'S2', 'Two-seat craft', 'make', 'EA', 0, 1), ('S4', 'S4', 'Four-seat craft', 'make', 'EA', 0, 1),
     ('CK', 'CK', 'Cabin set', 'phantom', 'EA', 0, 0), ('B', 'B', 'Bolt', 'buy', 'EA', 0, 0)`,
  );
  await database.query(
    "INSERT INTO kit_option (code, description) VALUES ('CAB', 'Cabin'), ('TRL', 'Trailer')",
  );
  await database.query(
    `INSERT INTO structure_line (parent_id, component_id, position, quantity, option_code)
     SELECT p.id, c.id, x.position, 1, x.code FROM
       (SELECT 'S2' parent, 'CK' component, 1 position, NULL code UNION SELECT 'CK', 'B', 1, 'CAB'
        UNION SELECT 'S2', 'B', 2, 'TRL' UNION SELECT 'S4', 'B', 1, NULL) x
       JOIN part p ON p.part_number = x.parent JOIN part c ON c.part_number = x.component`,
  );
});

describe("kits that can be ordered", () => {
  test("have the options of their own lines and of phantoms under them", async () => {
    const kits = await findKits();
    expect(kits.map((kit) => [kit.partNumber, kit.options.map((option) => option.code)])).toEqual([
      ["S2", ["CAB", "TRL"]],
      ["S4", []],
    ]);
  });
});

describe("entering an order", () => {
  test("gives the next number, raises the revision and leaves an audit event", async () => {
    const before = await revision();
    expect(await createKitOrder(order(), planner)).toBe("KO-0001");
    expect(await createKitOrder(order({ number: "KO-0040" }), planner)).toBe("KO-0040");
    expect(await createKitOrder(order(), planner)).toBe("KO-0041");
    expect(await revision()).toBe(before + 3);
    const events = await database.query("SELECT act, subject FROM audit_event ORDER BY id");
    expect(events[0]).toEqual({ act: "kit-orders", subject: "kit order KO-0001" });
    expect(events).toHaveLength(3);
  });

  test("keeps what was entered", async () => {
    await createKitOrder(
      order({ options: ["TRL", "CAB"], serial: "098", wantedOn: "2027-03-14", note: "By rail" }),
      planner,
    );
    expect(await getKitOrder("KO-0001")).toMatchObject({
      kit: "S2",
      options: ["CAB", "TRL"],
      serial: "098",
      wantedOn: "2027-03-14",
      note: "By rail",
      state: "open",
      version: 1,
    });
  });

  test("four at once get four numbers", async () => {
    const numbers = await Promise.all(
      ["S2", "S4", "S2", "S4"].map((kit) => createKitOrder(order({ kit }), planner)),
    );
    expect(new Set(numbers).size).toBe(4);
  });

  test.each([
    ["kit", { kit: "B" }],
    ["options", { kit: "S4", options: ["CAB"] }],
    ["priority", { priority: "soon" }],
    ["priority", { priority: "" }],
    ["serial", { serial: "blue" }],
    ["wantedOn", { wantedOn: "2027-02-30" }],
    ["number", { number: "KO 1/2" }],
  ])("refuses a wrong %s", async (field, overrides) => {
    const error = await failure(createKitOrder(order(overrides), planner));
    expect(error).toMatchObject({ code: "invalid", errors: [{ field }] });
    expect((await findKitOrders()).open).toEqual([]);
  });

  test("refuses a number and a serial that are taken, also by two at once", async () => {
    await createKitOrder(order({ serial: "098", number: "A-1" }), planner);
    expect(await failure(createKitOrder(order({ serial: "098" }), planner))).toMatchObject({
      errors: [{ field: "serial", message: "S2 with this serial is order A-1 already." }],
    });
    expect(await failure(createKitOrder(order({ number: "A-1" }), planner))).toMatchObject({
      errors: [{ field: "number" }],
    });
    expect(await createKitOrder(order({ kit: "S4", serial: "098" }), planner)).toBe("KO-0001");
    const both = await Promise.allSettled([
      createKitOrder(order({ serial: "099" }), planner),
      createKitOrder(order({ serial: "099" }), planner),
    ]);
    expect(both.map((one) => one.status).sort()).toEqual(["fulfilled", "rejected"]);
  });

  test("is not for the clerk", async () => {
    expect(await failure(createKitOrder(order(), clerk))).toMatchObject({ code: "forbidden" });
  });
});

describe("changing an order", () => {
  test("changes it and keeps its number", async () => {
    await createKitOrder(order({ options: ["CAB"], serial: "098" }), planner);
    await updateKitOrder(
      "KO-0001",
      order({ options: ["TRL"], serial: "098", priority: "5", version: "1" }),
      planner,
    );
    expect(await getKitOrder("KO-0001")).toMatchObject({ options: ["TRL"], priority: 5, version: 2 });
  });

  test("refuses to write over somebody else's change", async () => {
    await createKitOrder(order(), planner);
    await updateKitOrder("KO-0001", order({ customer: "First", version: "1" }), planner);
    const error = await failure(
      updateKitOrder("KO-0001", order({ customer: "Second", version: "1" }), planner),
    );
    expect(error.code).toBe("conflict");
    expect((await getKitOrder("KO-0001")).customer).toBe("First");
  });

  test("a cancelled order leaves the queue, frees its serial and stays as it is", async () => {
    await createKitOrder(order({ serial: "098" }), planner);
    await cancelKitOrder("KO-0001", 1, planner);
    const { open, closed } = await findKitOrders();
    expect([open.length, closed.map((one) => one.state)]).toEqual([0, ["cancelled"]]);
    expect(await failure(updateKitOrder("KO-0001", order({ version: "2" }), planner))).toMatchObject({
      code: "conflict",
    });
    expect(await createKitOrder(order({ serial: "098" }), planner)).toBe("KO-0002");
  });
});

test("open orders come in the order in which they are served", async () => {
  await createKitOrder(order({ number: "C", priority: "2", wantedOn: "2027-01-01" }), planner);
  await createKitOrder(order({ number: "D", priority: "2" }), planner);
  await createKitOrder(order({ number: "B", priority: "2", wantedOn: "2026-12-24" }), planner);
  await createKitOrder(order({ number: "A", priority: "1" }), planner);
  expect((await findKitOrders()).open.map((one) => one.number)).toEqual(["A", "B", "C", "D"]);
});
