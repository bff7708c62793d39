import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Role } from "~/schemas/people/role";
import { createToken } from "~/services/people/create-token.server";
import { bring } from "../services/imports/import-support";
import { useTestDatabase } from "../support/database";
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

/** A kit of one drive and two bolts; the drive takes four bolts; 23 bolts in two lots and 1 drive here. */
beforeEach(async () => {
  await bring("bins", "bin,zone,walk_order\nA1,Store,1\n");
  await bring(
    "parts",
    `part_number,description,sourcing,lead_time_days,unit_cost,sold
KIT,Kit one,make,2,,1
DRIVE,"Drive, lift",make,3,,0
BOLT,"Bolt, hex",buy,10,0.25,0
LAMP,"Lamp, bow",buy,20,9.50,0
`,
  );
  await bring(
    "structure",
    "parent,component,quantity,option\nKIT,DRIVE,1,\nKIT,BOLT,2,\nKIT,LAMP,1,NIGHT\nDRIVE,BOLT,4,\n",
  );
  await bring("stock", "part_number,bin,lot,quantity\nBOLT,A1,L1,20\nBOLT,A1,L2,3\nDRIVE,A1,,1\n");
  await bring("supply", "part_number,quantity,due,reference\nBOLT,30,2999-01-10,PO-1\n");
});

async function ask(path: string, { role = "manager" as Role, body = undefined as unknown } = {}) {
  const headers: Record<string, string> = {
    ...OURS,
    Authorization: `Bearer ${await createToken({ role, name: "plan" })}`,
  };
  if (body !== undefined) headers["Content-Type"] = "application/json";
  const response = await application(path, {
    method: body === undefined ? "GET" : "POST",
    headers,
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  return { status: response.status, body: await response.json() };
}

const five = [{ partNumber: "KIT", quantity: "5" }];

async function buildable(whatIf: unknown): Promise<unknown> {
  const { status, body } = await ask("/api/ship-check", { body: { demand: five, whatIf } });
  return status === 200 ? body.buildable.KIT : body;
}

describe("GET /api/ship-check", () => {
  it("answers for the live stock", async () => {
    const { status, body } = await ask("/api/ship-check?kit=kit&quantity=5");
    expect(status).toBe(200);
    // 23 bolts: two for the first kit with the drive that is here, six for each other.
    expect(body).toMatchObject({
      demand: [{ partNumber: "KIT", quantity: "5", due: null, options: [], serial: null, buildable: 4 }],
      buildable: { KIT: 4 },
      shortages: [
        { partNumber: "BOLT", missing: "3", gross: "26", fromStock: "23", onOrder: "3", stopsAt: 5 },
      ],
    });
    expect(body.ladder).toHaveLength(5);
  });

  it.each([
    ["quantity=5", 422, "kit"],
    ["kit=KIT", 422, "quantity"],
    ["kit=KIT&quantity=0", 422, "quantity"],
    ["kit=KIT&quantity=1.5", 422, "quantity"],
    ["kit=KIT&quantity=1e3", 422, "quantity"],
    ["kit=KIT&quantity=1&by=2027-02-30", 422, "by"],
    ["kit=KIT&quantity=1&options=FLOATS", 422, "options"],
    ["kit=NOPE&quantity=1", 404, "kit"],
  ])("refuses %s with %i", async (query, status, field) => {
    const answer = await ask(`/api/ship-check?${query}`);
    expect(answer).toMatchObject({ status, body: { status, errors: [{ field }] } });
  });

  it("hides costs from those who may not see them", async () => {
    const seen = await ask("/api/ship-check?kit=KIT&quantity=5&options=NIGHT", { role: "purchaser" });
    expect(seen.body.ladder[0].cost).toBe("9.50");
    const hidden = await ask("/api/ship-check?kit=KIT&quantity=5&options=NIGHT", { role: "clerk" });
    expect(hidden.body.ladder.map((rung: { cost: unknown }) => rung.cost)).toEqual(Array(5).fill(null));
    expect((await ask("/api/parts/LAMP", { role: "clerk" })).body.unitCost).toBeNull();
    expect((await ask("/api/parts/LAMP")).body.unitCost).toBe("9.5");
  });
});

describe("POST /api/ship-check", () => {
  it.each([
    ["more stock", { stock: [{ partNumber: "BOLT", change: "+3" }] }, 5],
    ["less stock", { stock: [{ partNumber: "BOLT", change: "-4" }] }, 3],
    ["a lot held", { hold: [{ partNumber: "BOLT", lot: "L1" }] }, 1],
    ["every lot held", { hold: [{ partNumber: "bolt" }] }, 0],
    ["a structure replaced whole", { structure: [{ parent: "DRIVE", component: "BOLT", quantity: "1" }] }, 8],
  ])("tries %s", async (_, whatIf, kits) => {
    expect(await buildable(whatIf)).toBe(kits);
  });

  it("tries orders, dates and lead times on the day the kits are complete", async () => {
    const earliest = async (whatIf: unknown) =>
      (await ask("/api/ship-check", { body: { demand: five, whatIf } })).body.earliest.KIT;
    expect(await earliest({})).toBe("2999-01-15");
    expect(await earliest({ supply: [{ reference: "PO-1", due: "2999-01-08" }] })).toBe("2999-01-13");
    expect(await earliest({ supply: [{ partNumber: "BOLT", quantity: "3", due: "2998-01-10" }] })).toBe(
      "2998-01-15",
    );
    expect(await earliest({ parts: [{ part_number: "DRIVE", lead_time_days: "1" }] })).toBe("2999-01-13");
  });

  it("answers as if it had been done, and stores nothing", async () => {
    const tables = [
      "movement",
      "balance",
      "structure_line",
      "part",
      "purchase_order_line",
      "audit_event",
      "revision",
    ];
    const count = () =>
      Promise.all(tables.map((table) => database.query(`SELECT * FROM ${table} ORDER BY 1`)));
    const before = await count();
    const tried = await ask("/api/ship-check", {
      body: { demand: five, whatIf: { stock: [{ partNumber: "BOLT", change: "+2" }] } },
    });
    expect(await count()).toEqual(before);
    await bring("stock", "part_number,bin,lot,quantity\nBOLT,A1,L2,5\n");
    expect((await ask("/api/ship-check", { body: { demand: five } })).body).toEqual(tried.body);
  });

  it("serves the open kit orders first where it is asked so", async () => {
    await bring("kit-orders", "number,kit,priority\nKO-1,KIT,1\nKO-2,KIT,2\n");
    const after = await ask("/api/ship-check", { body: { demand: five, after: "open-orders" } });
    expect(after.body).toMatchObject({
      demand: [{ quantity: "5", buildable: 2 }],
      shortages: [{ partNumber: "BOLT", gross: "30", missing: "15", stopsAt: 3 }],
    });
    expect((await ask("/api/ship-check", { body: { demand: five } })).body.buildable.KIT).toBe(4);
  });

  it.each([
    ["an unknown part", { stock: [{ partNumber: "NUT", change: "1" }] }, /no part NUT/],
    ["less than nothing", { stock: [{ partNumber: "BOLT", change: "-24" }] }, /only 23 of BOLT/],
    ["half a bolt", { stock: [{ partNumber: "BOLT", change: "0.5" }] }, /0 decimals/],
    ["an unknown lot", { hold: [{ partNumber: "BOLT", lot: "L9" }] }, /lot L9/],
    ["an unknown order", { supply: [{ reference: "PO-9", due: null }] }, /number PO-9/],
    ["a loop", { structure: [{ parent: "DRIVE", component: "KIT", quantity: "1" }] }, /DRIVE > KIT > DRIVE/],
    ["half a lamp", { structure: [{ parent: "KIT", component: "LAMP", quantity: "0.5" }] }, /0 decimals/],
    ["a new part without sourcing", { parts: [{ part_number: "NUT" }] }, /say its sourcing/],
    ["an unknown column", { parts: [{ part_number: "BOLT", colour: "red" }] }, /valid/],
  ])("refuses %s", async (_, whatIf, sentence) => {
    const { status, body } = await ask("/api/ship-check", { body: { demand: five, whatIf } });
    expect(status).toBe(422);
    expect(`${body.title} ${body.detail}`).toMatch(sentence);
    expect(body.errors.length).toBeGreaterThan(0);
  });
});

describe("the other planning routes", () => {
  it("says what the ship line waits for", async () => {
    expect((await ask("/api/ship-line")).body).toMatchObject({ ready: 0, of: 0, next: null, allBy: null });
    await bring("kit-orders", "number,kit,priority,options\nKO-1,KIT,2,\nKO-2,KIT,1,NIGHT\nKO-3,KIT,3,\n");
    expect((await ask("/api/ship-line")).body).toMatchObject({
      ready: 2,
      of: 3,
      next: { kitOrder: "KO-2", partNumber: "KIT", stoppers: [{ partNumber: "LAMP", missing: "1" }] },
      revision: expect.any(Number),
    });
  });

  it("finds parts by every word, with signs that mean nothing else", async () => {
    const numbers = async (q: string) =>
      (await ask(`/api/parts?q=${encodeURIComponent(q)}`)).body.parts.map(
        (part: { partNumber: string }) => part.partNumber,
      );
    expect(await numbers("hex bol")).toEqual(["BOLT"]);
    expect(await numbers("")).toEqual(["BOLT", "DRIVE", "KIT", "LAMP"]);
    expect(await numbers("%")).toEqual([]);
    expect(await numbers("L_MP")).toEqual([]);
    expect((await ask("/api/parts?size=2&page=2")).body).toMatchObject({
      total: 4,
      parts: [{ partNumber: "KIT" }, {}],
    });
    expect((await ask("/api/parts?size=0")).status).toBe(422);
  });

  it("shows one part, its structure and where it is used", async () => {
    expect((await ask("/api/parts/bolt")).body).toMatchObject({
      partNumber: "BOLT",
      balances: [
        { bin: "A1", lot: "L1", state: "usable", quantity: "20" },
        { bin: "A1", lot: "L2", state: "usable", quantity: "3" },
      ],
      onOrder: [{ reference: "PO-1", quantity: "30", due: "2999-01-10" }],
      whereUsed: [
        { partNumber: "DRIVE", quantity: "4" },
        { partNumber: "KIT", quantity: "2" },
      ],
    });
    const tree = (await ask("/api/structure/KIT")).body;
    expect(tree.components.map((node: { partNumber: string }) => node.partNumber)).toEqual([
      "DRIVE",
      "BOLT",
      "LAMP",
    ]);
    expect(tree.components[0].components).toMatchObject([{ partNumber: "BOLT", quantity: "4" }]);
    expect((await ask("/api/structure/KIT?levels=1")).body.components[0].components).toEqual([]);
    for (const path of ["parts", "structure", "where-used"]) {
      expect((await ask(`/api/${path}/NOPE`)).status).toBe(404);
    }
  });
});

describe("POST /api/effects", () => {
  const change = { stock: [{ partNumber: "BOLT", change: "-20" }] };

  it("says the ship line before and after, to everybody who may look", async () => {
    await bring("kit-orders", "number,kit,priority\nKO-1,KIT,1\nKO-2,KIT,2\n");
    const { status, body } = await ask("/api/effects", { role: "clerk", body: { change } });
    expect(status).toBe(200);
    expect(body).toMatchObject({
      before: { ready: 2, of: 2, next: null },
      after: {
        ready: 1,
        of: 2,
        next: { kitOrder: "KO-2", stoppers: [{ partNumber: "BOLT", missing: "5" }] },
      },
      becomeReady: [],
      stop: [{ kitOrder: "KO-2" }],
    });
    expect((await ask("/api/ship-line")).body).toMatchObject({ ready: 2, of: 2 });
  });

  it.each([
    ["nothing", {}, "change"],
    ["an unknown list", { change: { colour: [] } }, "change"],
    [
      "a quantity in words",
      { change: { stock: [{ partNumber: "BOLT", change: "some" }] } },
      "change.stock.0.change",
    ],
    [
      "a priority of 0",
      { change: { kitOrders: { change: [{ number: "KO-1", priority: 0 }] } } },
      "change.kitOrders.change.0.priority",
    ],
    [
      "an unknown part",
      { change: { stock: [{ partNumber: "NUT", change: "1" }] } },
      "change.stock.0.partNumber",
    ],
  ])("refuses %s with 422", async (_, body, field) => {
    expect(await ask("/api/effects", { body })).toMatchObject({ status: 422, body: { errors: [{ field }] } });
  });

  it("is closed to strangers and to other sites", async () => {
    const send = (headers: Record<string, string>) =>
      application("/api/effects", {
        method: "POST",
        headers: { "Content-Type": "application/json", ...headers },
        body: JSON.stringify({ change }),
      });
    expect((await send(OURS)).status).toBe(401);
    expect((await send({ Origin: "http://elsewhere.example" })).status).toBe(403);
    expect((await ask("/api/effects")).status).toBe(405);
  });
});

describe("GET /api/why", () => {
  it("opens a number of a part to its causes", async () => {
    const { status, body } = await ask("/api/why?kit=KIT&quantity=3&part=BOLT");
    expect(status).toBe(200);
    expect(body).toMatchObject({ gross: "14", rest: "0", causes: [{ need: "6" }, { need: "8" }] });
  });

  it("refuses what cannot be asked, with a sentence", async () => {
    expect((await ask("/api/why?kit=KIT")).body.errors).toMatchObject([{ field: "part" }]);
    expect((await ask("/api/why?kit=KIT&part=NUT")).status).toBe(404);
    expect((await ask("/api/why?kit=KIT&part=BOLT&kits=0")).status).toBe(422);
  });
});

describe("GET /api/check-csv", () => {
  it("sends the parts that are missing as a file, with what was tried", async () => {
    const headers = { Authorization: `Bearer ${await createToken({ role: "planner", name: "csv" })}` };
    const address = "/api/check-csv?kit=KIT&quantity=5&options=NIGHT&if=stock:BOLT:-3";
    const response = await application(address, { headers });
    expect(response.headers.get("Content-Type")).toBe("text/csv; charset=utf-8");
    expect(await response.text()).toMatch(/BOLT.*LAMP|LAMP[\s\S]*BOLT|BOLT[\s\S]*LAMP/);
    expect((await application(address)).status).toBe(401);
    expect((await application("/api/check-csv?kit=NONE", { headers })).status).toBe(422);
  });
});
