import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { Person } from "~/db/models/people/person";
import { PersonRole } from "~/db/models/people/person-role";
import type { MovementRequest } from "~/domain/stock/types";
import type { Role } from "~/schemas/people/role";
import { readRevision } from "~/services/revision/read-revision.server";
import { postMovements } from "~/services/stock/post-movements.server";
import { useTestDatabase } from "../../support/database";
import { expectSoundLedger } from "./expect-sound-ledger";
import {
  buildBin,
  buildPart,
  faultOf,
  issue,
  MANAGER,
  newKey,
  post,
  receive,
  usable,
} from "./stock-builders";

const database = useTestDatabase();

const balances = () =>
  database.query(
    "SELECT bin.code AS bin, state, lot_code AS lot, quantity, sequence FROM balance JOIN bin ON bin.id = bin_id JOIN lot ON lot.id = lot_id ORDER BY bin.code, state, lot_code",
  );

async function buildPerson(...roles: Role[]) {
  const person = await Person.create({
    name: "Wren Adlington",
    email: `${newKey()}@saltmarsh.example`,
    passwordHash: "none",
  });
  for (const role of roles) await PersonRole.create({ personId: person.id, role });
  return { personId: person.id, roles };
}

describe("postMovements", () => {
  beforeEach(async () => {
    await buildPart("HB-2041");
    await buildPart("WEB-25", { decimals: 3, unit: "MTR" });
    await buildBin("A12");
    await buildBin("A21");
  });
  afterEach(expectSoundLedger);

  it("posts every kind and keeps the balances by state", async () => {
    const held = { bin: "A12", state: "held" as const };
    const posted = await post([
      { kind: "receive", partNumber: " hb-2041", quantity: "10", to: usable("a12"), reference: "PO-7" },
      { kind: "hold", partNumber: "HB-2041", quantity: "4", from: usable("A12"), to: held },
      { kind: "release", partNumber: "HB-2041", quantity: "1", from: held, to: usable("A12") },
      { kind: "move", partNumber: "HB-2041", quantity: "2", from: usable("A12"), to: usable("A21") },
      { kind: "issue", partNumber: "HB-2041", quantity: "1", from: usable("A21") },
      { kind: "return", partNumber: "HB-2041", quantity: "1", to: usable("A21") },
      { kind: "scrap", partNumber: "HB-2041", quantity: "1", from: held },
      {
        kind: "adjust",
        partNumber: "HB-2041",
        quantity: "5",
        to: usable("A21"),
        reason: "found behind the rack",
      },
    ]);
    expect(posted.movements).toHaveLength(8);
    expect(posted.movements[0]).toMatchObject({
      partNumber: "HB-2041",
      quantity: "10",
      lot: "",
      reference: "PO-7",
    });
    expect(await balances()).toMatchObject([
      { bin: "A12", state: "usable", quantity: "5.000000", sequence: 4 },
      { bin: "A12", state: "held", quantity: "2.000000", sequence: 3 },
      { bin: "A21", state: "usable", quantity: "7.000000", sequence: 4 },
    ]);
    expect((await readRevision(["stock"])).stock).toBe(posted.revision);
    expect(await database.query("SELECT act FROM audit_event")).toEqual([{ act: "post-movements" }]);
  });

  it("keeps decimals, lots, expiry dates and moments exactly", async () => {
    const happenedAt = "2026-03-29T02:30:00.125+01:00";
    const webbing = {
      kind: "receive",
      partNumber: "WEB-25",
      lot: " L7 ",
      to: usable("A12"),
      happenedAt,
    } as const;
    await post([
      { ...webbing, quantity: "12345678901.350", expiresOn: "2027-06-10" },
      { ...webbing, quantity: "0.1" },
      { ...webbing, quantity: "0.200" },
    ]);
    expect(await balances()).toMatchObject([{ lot: "L7", quantity: "12345678901.650000" }]);
    const [{ moment }] = await database.query(
      "SELECT DATE_FORMAT(happened_at, '%H:%i:%s.%f') AS moment FROM movement LIMIT 1",
    );
    expect(moment).toBe("01:30:00.125000");
    expect(await database.query("SELECT expires_on AS expiresOn FROM lot")).toMatchObject([
      { expiresOn: expect.anything() },
    ]);
  });

  it("refuses what is not there, naming part, bin and on hand, and keeps nothing", async () => {
    await post([receive("HB-2041", "4", "A12")]);
    const fault = await faultOf(post([receive("HB-2041", "1", "A21"), issue("HB-2041", "6", "A12")]));
    expect(fault.code).toBe("conflict");
    expect(fault.message).toBe(
      "HB-2041 in bin A12 (usable): 4 EA on hand, not enough to take 6 EA. Nothing was posted.",
    );
    expect(fault.errors).toMatchObject([{ line: 2, field: "quantity" }]);
    expect(await balances()).toMatchObject([{ bin: "A12", quantity: "4.000000" }]);
  });

  it("never goes below zero on the way, not even where a later movement fills up again", async () => {
    const fault = await faultOf(post([issue("HB-2041", "1", "A12"), receive("HB-2041", "1", "A12")]));
    expect(fault.code).toBe("conflict");
  });

  it.each<[string, Partial<MovementRequest>, string]>([
    ["an unknown part", { partNumber: "constructor" }, "partNumber"],
    ["an unknown bin", { to: usable("__proto__") }, "to"],
    ["too many decimals", { quantity: "1.5" }, "quantity"],
    ["an exponent", { quantity: "1e3" }, "quantity"],
    ["nothing", { quantity: "0.000" }, "quantity"],
    ["a negative quantity", { quantity: "-1" }, "quantity"],
    ["more than can be stored", { quantity: "123456789012345" }, "quantity"],
    ["a wrong side", { from: usable("A21") }, "to"],
    ["tomorrow", { happenedAt: new Date(Date.now() + 86_400_000).toISOString() }, "happenedAt"],
    ["an adjustment without a reason", { kind: "adjust" }, "reason"],
  ])("refuses %s", async (_what, change, field) => {
    const fault = await faultOf(
      post([receive("HB-2041", "1", "A12"), { ...receive("HB-2041", "1", "A12"), ...change }]),
    );
    expect(fault.code).toBe("invalid");
    expect(fault.errors).toMatchObject([{ line: 2, field }]);
    expect(await balances()).toEqual([]);
  });

  it("takes 1 to 500 movements, more only where the caller says so", async () => {
    const many = Array.from({ length: 501 }, () => receive("HB-2041", "1", "A12"));
    expect((await faultOf(post([]))).code).toBe("invalid");
    expect((await faultOf(post(many))).code).toBe("invalid");
    await postMovements({ actor: MANAGER, idempotencyKey: newKey(), movements: many, most: 10_000 });
    expect(await balances()).toMatchObject([{ quantity: "501.000000", sequence: 501 }]);
  });

  it("gives the first answer again for the same key and content, however it is written", async () => {
    const key = newKey();
    const first = await post([receive("HB-2041", "1", "A12")], key);
    expect(await post([receive("hb-2041", "1.0", " a12")], key)).toEqual(first);
    expect((await faultOf(post([receive("HB-2041", "2", "A12")], key))).code).toBe("invalid");
    expect((await faultOf(post([receive("HB-2041", "2", "A12")], "short"))).code).toBe("bad-request");
    expect(await balances()).toMatchObject([{ quantity: "1.000000" }]);
  });

  it("asks the right of every kind", async () => {
    const clerk = await buildPerson("clerk");
    const attempt = (movement: MovementRequest) =>
      postMovements({ actor: clerk, idempotencyKey: newKey(), movements: [movement] });
    await attempt(receive("HB-2041", "3", "A12"));
    expect((await faultOf(attempt(issue("HB-2041", "1", "A12")))).code).toBe("forbidden");
    await attempt({
      kind: "adjust",
      partNumber: "HB-2041",
      quantity: "1",
      from: usable("A12"),
      reason: "lost",
    });
  });

  it("counts a role taken away and an account disabled since signing in", async () => {
    const clerk = await buildPerson("clerk");
    const attempt = () =>
      postMovements({ actor: clerk, idempotencyKey: newKey(), movements: [receive("HB-2041", "1", "A12")] });
    await PersonRole.destroy({ where: { personId: clerk.personId } });
    expect((await faultOf(attempt())).code).toBe("forbidden");
    await Person.update({ disabledAt: new Date() }, { where: { id: clerk.personId } });
    expect((await faultOf(attempt())).code).toBe("unauthenticated");
  });
});
