import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Role } from "~/schemas/people/role";
import { createToken } from "~/services/people/create-token.server";
import { startSession } from "~/services/people/start-session.server";
import { bring } from "../services/imports/import-support";
import { expectSoundLedger } from "../services/stock/expect-sound-ledger";
import { newKey } from "../services/stock/stock-builders";
import { useTestDatabase } from "../support/database";
import { insertPerson } from "../support/people/insert-person";
import { makeBuild, OURS, readRoutes, startApplication } from "./application";

const database = useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

let application: Awaited<ReturnType<typeof startApplication>>;

beforeAll(async () => {
  const build = await makeBuild(await readRoutes());
  built.routes = build.routes;
  application = await startApplication(build);
});

beforeEach(async () => {
  await bring("bins", "bin,zone,walk_order\nA1,Store,1\nA2,Store,2\n");
  await bring(
    "parts",
    "part_number,sourcing,unit,decimals,sold\nKIT,make,EA,0,1\nHB-2041,buy,EA,0,0\nWEB-25,buy,MTR,3,0\n",
  );
  await bring("structure", "parent,component,quantity\nKIT,HB-2041,2\n");
  await bring("kit-orders", "number,kit,priority\nKO-1,KIT,1\nKO-2,KIT,2\n");
});
afterEach(expectSoundLedger);

interface Asked {
  role?: Role;
  body?: unknown;
  key?: string | null;
  headers?: Record<string, string>;
}

async function ask(path: string, { role = "manager", body, key = null, headers = {} }: Asked = {}) {
  const response = await application(path, {
    method: body === undefined ? "GET" : "POST",
    headers: {
      ...OURS,
      Authorization: `Bearer ${await createToken({ role, name: "ledger" })}`,
      ...(body !== undefined && { "Content-Type": "application/json" }),
      ...(key !== null && { "Idempotency-Key": key }),
      ...headers,
    },
    body: body === undefined ? undefined : typeof body === "string" ? body : JSON.stringify(body),
  });
  return { status: response.status, type: response.headers.get("Content-Type"), body: await response.json() };
}

const post = (movements: unknown, asked: Asked = {}) =>
  ask("/api/movements", { key: newKey(), body: { movements }, ...asked });

const receive = (quantity = "4", change: object = {}) => ({
  kind: "receive",
  partNumber: "HB-2041",
  quantity,
  lot: null,
  from: null,
  to: { bin: "A1", state: "usable" },
  happenedAt: "2026-11-30T08:00:00Z",
  reason: "",
  reference: "PO-7",
  ...change,
});

const movementCount = async () =>
  Number((await database.query("SELECT COUNT(*) AS found FROM movement"))[0].found);

describe("POST /api/movements", () => {
  it("posts, and answers 201 with ids, revision and the ship line after it", async () => {
    const { status, body } = await post([receive("2"), receive("1")]);
    expect(status).toBe(201);
    expect(body).toMatchObject({
      movements: [
        {
          id: expect.any(Number),
          kind: "receive",
          partNumber: "HB-2041",
          quantity: "2",
          from: null,
          to: { bin: "A1", state: "usable" },
          happenedAt: "2026-11-30T08:00:00.000Z",
          reference: "PO-7",
        },
        { quantity: "1" },
      ],
      revision: expect.any(Number),
      shipLine: { ready: 1, of: 2, next: { kitOrder: "KO-2" } },
    });
  });

  it("posts every kind with the sides that it has", async () => {
    const [usable, held, elsewhere] = [
      { bin: "A1", state: "usable" },
      { bin: "A1", state: "held" },
      { bin: "A2", state: "usable" },
    ];
    const one = (kind: string, from: object | null, to: object | null) =>
      receive("1", { kind, from, to, reason: "as found" });
    const { status, body } = await post([
      receive("9"),
      one("move", usable, elsewhere),
      one("hold", usable, held),
      one("release", held, usable),
      one("issue", usable, null),
      one("return", null, usable),
      one("scrap", usable, null),
      one("adjust", usable, null),
      one("adjust", null, usable),
    ]);
    expect({ status, errors: body.errors }).toEqual({ status: 201, errors: undefined });
    expect((await ask("/api/stock?partNumber=hb-2041")).body.balances).toMatchObject([
      { bin: "A1", state: "usable", quantity: "7" },
      { bin: "A2", state: "usable", quantity: "1" },
    ]);
    for (const [kind, from, to] of [
      ["receive", usable, null],
      ["issue", null, usable],
      ["move", usable, null],
      ["adjust", usable, elsewhere],
    ] as const) {
      expect((await post([one(kind, from, to)])).status).toBe(422);
    }
  });

  it("gives the first answer back to the same key, whatever was posted since", async () => {
    const key = newKey();
    const first = await post([receive()], { key });
    await post([receive("10")]);
    const again = await post([receive("4.0", { partNumber: " hb-2041 " })], { key });
    expect(again).toEqual(first);
    expect(await movementCount()).toBe(2);
  });

  it("tells all who send one key at the same time the same", async () => {
    const key = newKey();
    const answers = await Promise.all(Array.from({ length: 8 }, () => post([receive()], { key })));
    const told = answers.filter(({ status }) => status === 201).map(({ body }) => body);
    expect(told.length).toBeGreaterThan(0);
    for (const body of told) expect(body).toEqual(told[0]);
    expect(answers.every(({ status }) => status === 201 || status === 409)).toBe(true);
    expect(await movementCount()).toBe(1);
  });

  it("refuses a key with other content, of somebody else, malformed or missing", async () => {
    const key = newKey();
    await post([receive()], { key });
    expect((await post([receive("5")], { key })).status).toBe(422);
    for (const bad of [null, "short", "with a space", `long${"x".repeat(200)}`]) {
      const { status, type, body } = await post([receive()], { key: bad });
      expect({ status, type }).toEqual({ status: 400, type: "application/problem+json; charset=utf-8" });
      expect(body.detail).toContain("Idempotency-Key");
    }
    const other = await insertPerson(["clerk"]);
    const answer = await application("/api/movements", {
      method: "POST",
      headers: {
        ...OURS,
        Cookie: `cotterpin_session=${await startSession(other, null)}`,
        "Content-Type": "application/json",
        "Idempotency-Key": key,
      },
      body: JSON.stringify({ movements: [receive()] }),
    });
    expect(answer.status).toBe(422);
    expect(await movementCount()).toBe(1);
  });

  it("answers 409 while the first request with a key is still running", async () => {
    await post([receive()]);
    const key = newKey();
    await database.query("START TRANSACTION");
    await database.query("INSERT INTO idempotency_key (`key`, fingerprint) VALUES (?, 'another')", [key]);
    const { status } = await post([receive()], { key });
    await database.query("ROLLBACK");
    expect(status).toBe(409);
    expect((await post([receive()], { key })).status).toBe(201);
  });

  it("posts all or none, and names line and field", async () => {
    const { status, body } = await post([
      receive(),
      { ...receive("6"), kind: "issue", to: null, from: { bin: "A1", state: "usable" } },
    ]);
    expect(status).toBe(409);
    expect(body.detail).toContain("HB-2041 in bin A1 (usable): 4 EA on hand, not enough to take 6 EA.");
    expect(body.errors).toMatchObject([{ line: 2, field: "quantity" }]);
    expect(await movementCount()).toBe(0);
  });

  it.each<[string, object, string]>([
    ["an unknown kind", { kind: "steal" }, "kind"],
    ["a reversal", { kind: "reverse" }, "kind"],
    ["an unknown part", { partNumber: "NOPE" }, "partNumber"],
    ["a list for a part", { partNumber: ["HB-2041"] }, "partNumber"],
    ["an object for a bin", { to: { bin: { id: 1 }, state: "usable" } }, "to.bin"],
    ["an unknown bin", { to: { bin: "Z9", state: "usable" } }, "to"],
    ["an unknown state", { to: { bin: "A1", state: "lost" } }, "to.state"],
    ["a number for a quantity", { quantity: 4 }, "quantity"],
    ["half a bearing", { quantity: "0.5" }, "quantity"],
    ["nothing", { quantity: "0" }, "quantity"],
    ["less than nothing", { quantity: "-1" }, "quantity"],
    ["an exponent", { quantity: "1e2" }, "quantity"],
    ["a day that is none", { happenedAt: "2026-02-30T08:00:00Z" }, "happenedAt"],
    ["a day to come", { happenedAt: "2999-01-01T08:00:00Z" }, "happenedAt"],
    ["a moment without an offset", { happenedAt: "2026-11-30T08:00:00" }, "happenedAt"],
    ["an adjustment without a reason", { kind: "adjust" }, "reason"],
    ["a reason of 501 characters", { reason: "x".repeat(501) }, "reason"],
    ["an id of one's own", { id: 7 }, "id"],
    ["another's name", { personId: 1 }, "personId"],
    ["a field too many in a side", { to: { bin: "A1", state: "usable", sequence: 9 } }, "to.sequence"],
  ])("refuses %s with 422, and keeps nothing", async (_what, change, field) => {
    const { status, type, body } = await post([receive(), receive("4", change)]);
    expect({ status, type }).toEqual({ status: 422, type: "application/problem+json; charset=utf-8" });
    expect(body.errors).toMatchObject([{ line: 2, field }]);
    expect(await movementCount()).toBe(0);
  });

  it("takes 1 to 500 movements in JSON", async () => {
    expect((await post([])).status).toBe(422);
    expect((await post(Array.from({ length: 501 }, () => receive()))).status).toBe(422);
    expect((await post({ 0: receive() })).status).toBe(422);
    expect((await ask("/api/movements", { body: "{", key: newKey() })).status).toBe(400);
    expect((await post([receive()], { headers: { "Content-Type": "text/plain" } })).status).toBe(415);
    expect(
      (await ask("/api/movements", { body: { movements: [receive()], mode: 1 }, key: newKey() })).body,
    ).toMatchObject({ status: 422, errors: [{ field: "mode" }] });
    expect((await post(Array.from({ length: 500 }, () => receive("1")))).body.movements).toHaveLength(500);
  });

  it.each<[Role, string[]]>([
    ["clerk", ["receive", "move", "hold", "scrap", "adjust"]],
    ["purchaser", ["receive", "move", "hold"]],
    ["builder", ["issue", "return", "scrap", "hold"]],
    ["planner", []],
  ])("lets the %s post what is theirs", async (role, allowed) => {
    await post([receive("50"), receive("50", { to: { bin: "A1", state: "held" } })]);
    const [usable, held] = ["usable", "held"].map((state) => ({ bin: "A1", state }));
    const sides: Record<string, [object | null, object | null]> = {
      receive: [null, usable],
      return: [null, usable],
      issue: [usable, null],
      scrap: [usable, null],
      move: [usable, { bin: "A2", state: "usable" }],
      hold: [usable, held],
      release: [held, usable],
      adjust: [null, usable],
    };
    for (const [kind, [from, to]] of Object.entries(sides)) {
      const { status } = await post([receive("1", { kind, from, to, reason: "so" })], { role });
      // What is received may come back, too.
      const may = allowed.includes(kind) || (kind === "return" && allowed.includes("receive"));
      expect({ kind, status }).toEqual({ kind, status: may ? 201 : 403 });
    }
  });

  it("has no effect for strangers and from other sites", async () => {
    const cookie = `cotterpin_session=${await startSession(await insertPerson(["clerk"]), null)}`;
    const send = async (headers: Record<string, string>) =>
      (
        await application("/api/movements", {
          method: "POST",
          headers: { "Content-Type": "application/json", "Idempotency-Key": newKey(), ...headers },
          body: JSON.stringify({ movements: [receive()] }),
        })
      ).status;
    expect(await send(OURS)).toBe(401);
    for (const origin of ["http://elsewhere.example", "null"])
      expect(await send({ Cookie: cookie, Origin: origin })).toBe(403);
    expect(await send({ Cookie: cookie })).toBe(403);
    expect(await movementCount()).toBe(0);
    expect(await send({ Cookie: cookie, ...OURS })).toBe(201);
  });
});

describe("POST /api/movements/:id/reverse", () => {
  it("takes a movement back, once", async () => {
    const { body } = await post([receive("2")]);
    const address = `/api/movements/${body.movements[0].id}/reverse`;
    const reversed = await ask(address, { body: { reason: "wrong part" } });
    expect(reversed).toMatchObject({
      status: 201,
      body: { reverses: body.movements[0].id, shipLine: { ready: 0, of: 2 } },
    });
    expect((await ask("/api/stock")).body.balances).toEqual([]);
    expect((await ask(address, { body: { reason: "wrong part" } })).status).toBe(409);
    expect((await ask(`/api/movements/${reversed.body.id}/reverse`, { body: { reason: "no" } })).status).toBe(
      409,
    );
  });

  it("gives the first answer back to the same key", async () => {
    const { body } = await post([receive("2")]);
    const address = `/api/movements/${body.movements[0].id}/reverse`;
    const key = newKey();
    const first = await ask(address, { body: { reason: "wrong part" }, key });
    await post([receive("20")]);
    expect(await ask(address, { body: { reason: "wrong part" }, key })).toEqual(first);
    expect((await ask(address, { body: { reason: "another" }, key })).status).toBe(422);
  });

  it("is for who made it, the same day, and for the manager", async () => {
    const maker = await insertPerson(["clerk"]);
    const as = async (personId: number, path: string, body: unknown) =>
      application(path, {
        method: "POST",
        headers: {
          ...OURS,
          Cookie: `cotterpin_session=${await startSession(personId, null)}`,
          "Content-Type": "application/json",
          "Idempotency-Key": newKey(),
        },
        body: JSON.stringify(body),
      });
    const made = await (await as(maker, "/api/movements", { movements: [receive(), receive()] })).json();
    const [first, second] = made.movements.map((movement: { id: number }) => movement.id);
    const other = await insertPerson(["clerk"], { name: "Otto Brandvik", email: "otto@saltmarsh.example" });
    const reason = { reason: "wrong bin" };
    expect((await as(other, `/api/movements/${first}/reverse`, reason)).status).toBe(403);
    expect((await as(maker, `/api/movements/${first}/reverse`, reason)).status).toBe(201);
    expect((await ask(`/api/movements/${second}/reverse`, { body: reason, role: "clerk" })).status).toBe(403);
    expect((await ask(`/api/movements/${second}/reverse`, { body: reason })).status).toBe(201);
  });

  it("refuses what is not there, no reason and fields too many", async () => {
    const { body } = await post([receive("2")]);
    const id = body.movements[0].id;
    for (const nowhere of [id + 1, 0, "-1", "1e3", "x", "9".repeat(20)])
      expect((await ask(`/api/movements/${nowhere}/reverse`, { body: { reason: "so" } })).status).toBe(404);
    for (const bad of [{}, { reason: " " }, { reason: ["so"] }, { reason: "so", movementId: 1 }])
      expect((await ask(`/api/movements/${id}/reverse`, { body: bad })).status).toBe(422);
    expect(await movementCount()).toBe(1);
  });
});

describe("GET /api/movements and GET /api/stock", () => {
  it("pages through the ledger in order, without a gap and without a double", async () => {
    const many = Array.from({ length: 230 }, (_, at) =>
      at % 2 ? receive("1") : receive("0.350", { partNumber: "WEB-25", lot: "L7" }),
    );
    const posted = (await post(many)).body.movements.map((movement: { id: number }) => movement.id);
    const walk = async (filter: string) => {
      const ids: number[] = [];
      let after: string | null = "0";
      for (let pages = 0; after !== null; pages++) {
        expect(pages).toBeLessThan(5);
        const { body } = await ask(`/api/movements?after=${after}${filter}`);
        ids.push(...body.movements.map((movement: { id: number }) => movement.id));
        after = body.next;
      }
      return ids;
    };
    expect(await walk("")).toEqual(posted);
    expect(await walk("&partNumber=web-25")).toEqual(posted.filter((_: number, at: number) => at % 2 === 0));
  });

  it("says who, when and what of each movement, and what it takes back", async () => {
    const person = await insertPerson(["clerk"]);
    await application("/api/movements", {
      method: "POST",
      headers: {
        ...OURS,
        Cookie: `cotterpin_session=${await startSession(person, null)}`,
        "Content-Type": "application/json",
        "Idempotency-Key": newKey(),
      },
      body: JSON.stringify({ movements: [receive("0.350", { partNumber: "WEB-25", lot: "L7" })] }),
    });
    const [{ id }] = (await ask("/api/movements")).body.movements;
    await ask(`/api/movements/${id}/reverse`, { body: { reason: "wrong roll" } });
    expect((await ask("/api/movements", { role: "planner" })).body).toMatchObject({
      next: null,
      movements: [
        {
          kind: "receive",
          partNumber: "WEB-25",
          unit: "MTR",
          quantity: "0.350",
          lot: "L7",
          from: null,
          to: { bin: "A1", state: "usable" },
          happenedAt: "2026-11-30T08:00:00.000Z",
          enteredAt: expect.stringMatching(/^20.*Z$/),
          person: "Wren Adlington",
          reverses: null,
          reversedBy: id + 1,
        },
        {
          kind: "reverse",
          quantity: "0.350",
          from: { bin: "A1", state: "usable" },
          to: null,
          person: null,
          reason: "wrong roll",
          reverses: id,
          reversedBy: null,
        },
      ],
    });
  });

  it("shows balances by part and bin, with what keeps them from use", async () => {
    await post([
      receive("4"),
      receive("3", { to: { bin: "A2", state: "held" } }),
      receive("1.500", { partNumber: "WEB-25", lot: "L1", expiresOn: "2020-01-01" }),
    ]);
    expect((await ask("/api/stock")).body.balances).toEqual([
      {
        partNumber: "HB-2041",
        unit: "EA",
        bin: "A1",
        lot: null,
        state: "usable",
        quantity: "4",
        expiresOn: null,
        standing: "usable",
      },
      expect.objectContaining({ partNumber: "HB-2041", bin: "A2", state: "held", standing: "held" }),
      expect.objectContaining({ partNumber: "WEB-25", lot: "L1", quantity: "1.500", standing: "expired" }),
    ]);
    expect((await ask("/api/stock?bin=a2")).body.balances).toMatchObject([{ quantity: "3" }]);
    expect((await ask("/api/stock?partNumber=KIT")).body.balances).toEqual([]);
  });

  it.each([
    ["/api/stock?partNumber=NOPE", 404, "partNumber"],
    ["/api/stock?bin=Z9", 404, "bin"],
    ["/api/movements?partNumber=NOPE", 404, "partNumber"],
    ["/api/movements?after=x", 422, "after"],
    ["/api/movements?after=-1", 422, "after"],
  ])("refuses %s with %i", async (path, status, field) => {
    expect(await ask(path)).toMatchObject({ status, body: { errors: [{ field }] } });
  });

  it("is for those who have signed in", async () => {
    for (const path of ["/api/movements", "/api/stock"]) expect((await application(path)).status).toBe(401);
  });
});
