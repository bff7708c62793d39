import { Validator } from "@seriousme/openapi-schema-validator";
import Ajv2020 from "ajv/dist/2020";
import addFormats from "ajv-formats";
import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { ALL_API_ROUTES } from "~/schemas/api/all-api-routes";
import { makeOpenapi } from "~/services/api/make-openapi";
import { createToken } from "~/services/people/create-token.server";
import { bring } from "../services/imports/import-support";
import { newKey } from "../services/stock/stock-builders";
import { useTestDatabase } from "../support/database";
import { makeBuild, OURS, readRoutes, startApplication } from "./application";

useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

const document = makeOpenapi() as {
  paths: Record<string, Record<string, { operationId: string; responses: Record<string, unknown> }>>;
  components: { schemas: Record<string, object> };
};
let application: Awaited<ReturnType<typeof startApplication>>;
let routes: Awaited<ReturnType<typeof readRoutes>>;
let ajv: Ajv2020;

beforeAll(async () => {
  routes = await readRoutes();
  const build = await makeBuild(routes);
  built.routes = build.routes;
  application = await startApplication(build);
  ajv = new Ajv2020({ strict: false, allErrors: true });
  addFormats(ajv);
  ajv.addSchema(document, "document");
});

beforeEach(async () => {
  await bring("bins", "bin,zone,walk_order\nA1,Store,1\n");
  await bring(
    "parts",
    "part_number,description,sourcing,lead_time_days,unit_cost,sold\nKIT,Kit one,make,2,,1\nDRIVE,Drive,make,3,,0\nBOLT,Bolt,buy,10,0.25,0\n",
  );
  await bring("structure", "parent,component,quantity\nKIT,DRIVE,1\nKIT,BOLT,2\nDRIVE,BOLT,4\n");
  await bring("stock", "part_number,bin,lot,quantity,state\nBOLT,A1,L1,20,usable\nBOLT,A1,L2,3,held\n");
  await bring("supply", "part_number,quantity,due,reference\nBOLT,30,2999-01-10,PO-1\n");
  await bring("kit-orders", "number,kit,priority\nKO-1,KIT,1\nKO-2,KIT,2\nKO-3,KIT,3\nKO-4,KIT,4\n");
});

interface Init {
  body?: string;
  type?: string;
  key?: string;
}

/** Sends a request and holds the answer against what the document says of that status. */
async function askAndCompare(operation: string, path: string, init: Init = {}) {
  const entry = ALL_API_ROUTES.find(({ id }) => id === operation);
  if (!entry) throw new Error(`The document has no operation ${operation}.`);
  const headers = {
    ...OURS,
    Authorization: `Bearer ${await createToken({ role: "manager", name: "document" })}`,
    ...(init.body !== undefined && { "Content-Type": init.type ?? "application/json" }),
    ...(init.key !== undefined && { "Idempotency-Key": init.key }),
  };
  const response = await application(path, { method: entry.method.toUpperCase(), headers, body: init.body });
  const body = await response.json();
  const type = response.headers.get("Content-Type")?.split(";")[0] ?? "";
  const pointer = [
    "paths",
    entry.path.replace(/:(\w+)/g, "{$1}"),
    entry.method,
    "responses",
    String(response.status),
    "content",
    type,
    "schema",
  ].map((step) => encodeURIComponent(step.replaceAll("~", "~0").replaceAll("/", "~1")));
  const check = ajv.compile({ $ref: `document#/${pointer.join("/")}` });
  check(body);
  return { status: response.status, faults: check.errors ?? [], body };
}

describe("the document of the JSON routes", () => {
  it("is valid OpenAPI 3.1", async () => {
    const result = await new Validator().validate(structuredClone(document));
    expect(result).toMatchObject({ valid: true });
  });

  it("names every JSON route with each of its methods, and no other", () => {
    const there = Object.values(routes).flatMap(({ path, module }) => {
      if (!path?.startsWith("api/")) return [];
      const methods = [module.loader && "get", module.action && "post"].filter(Boolean);
      return methods.map((method) => `${method} /${path}`);
    });
    expect(ALL_API_ROUTES.map(({ method, path }) => `${method} ${path}`).sort()).toEqual(there.sort());
  });

  it("names each operation once", () => {
    const ids = ALL_API_ROUTES.map(({ id }) => id);
    expect(new Set(ids).size).toBe(ids.length);
  });

  it("refers only to schemas that it holds", () => {
    const names = [...JSON.stringify(document).matchAll(/"\$ref":"([^"]+)"/g)].map(([, ref]) => ref);
    for (const name of names) expect(() => ajv.compile({ $ref: `document${name}` })).not.toThrow();
    expect(names).toContain("#/components/schemas/Problem");
  });

  it.each([
    ["getShipCheck", "/api/ship-check?kit=KIT&quantity=5"],
    ["getShipLine", "/api/ship-line"],
    ["getCheckAnswer", "/api/check-answer?kit=KIT&quantity=5&by=2999-01-01"],
    ["getWhy", "/api/why?kit=KIT&quantity=5&part=BOLT"],
    ["getWhy", "/api/why?through=KO-4&part=BOLT&with=orders"],
    ["searchEverything", "/api/find?q=bolt"],
    ["findParts", "/api/parts"],
    ["getPart", "/api/parts/BOLT"],
    ["getStructure", "/api/structure/KIT"],
    ["getWhereUsed", "/api/where-used/BOLT"],
    ["findMovements", "/api/movements?partNumber=BOLT"],
    ["findBalances", "/api/stock?bin=A1"],
    ["getHealth", "/api/health"],
    ["getOpenapi", "/api/openapi.json"],
  ])("says what %s answers to %s", async (operation, path) => {
    expect(await askAndCompare(operation, path)).toMatchObject({ status: 200, faults: [] });
  });

  it("says what the routes that take a body answer", async () => {
    const demand = [{ partNumber: "KIT", quantity: "5" }];
    const question = JSON.stringify({ demand, sharing: "release", after: "open-orders" });
    const change = { stock: [{ partNumber: "BOLT", change: "-12" }], kitOrders: { cancel: ["KO-1"] } };
    for (const [operation, path, body, type] of [
      ["askShipQuestion", "/api/ship-check", question, "application/json"],
      ["previewEffects", "/api/effects", JSON.stringify({ change }), "application/json"],
      ["importFile", "/api/imports/parts?dryRun=1", "part_number,sourcing\nNUT,buy\nBAD,\n", "text/csv"],
      ["importFile", "/api/imports/structure", "parent,component,quantity\nDRIVE,BOLT,3\n", "text/csv"],
    ]) {
      expect(await askAndCompare(operation, path, { body, type })).toMatchObject({ status: 200, faults: [] });
    }
  });

  it("says what posting and reversing answer, and how they refuse", async () => {
    const movement = {
      kind: "receive",
      partNumber: "BOLT",
      quantity: "2",
      to: { bin: "A1", state: "usable" },
    };
    const body = JSON.stringify({ movements: [movement] });
    const posted = await askAndCompare("postMovements", "/api/movements", { body, key: newKey() });
    expect(posted).toMatchObject({ status: 201, faults: [] });
    const address = `/api/movements/${posted.body.movements[0].id}/reverse`;
    const reason = { body: JSON.stringify({ reason: "wrong part" }) };
    for (const status of [201, 409])
      expect(await askAndCompare("reverseMovement", address, reason)).toMatchObject({ status, faults: [] });
    expect(await askAndCompare("postMovements", "/api/movements", { body })).toMatchObject({
      status: 400,
      faults: [],
    });
  });

  it.each([
    ["getShipCheck", "/api/ship-check?kit=KIT", 422],
    ["getPart", "/api/parts/NONE", 404],
    ["getWhy", "/api/why?kit=KIT&quantity=5", 422],
  ])("says how %s refuses %s", async (operation, path, status) => {
    expect(await askAndCompare(operation, path)).toMatchObject({ status, faults: [] });
  });

  it("describes bodies that it would take itself", () => {
    const check = ajv.compile({ $ref: "document#/components/schemas/AskShipQuestionBody" });
    expect(
      check({ demand: [{ partNumber: "S2", quantity: 10 }], whatIf: { hold: [{ partNumber: "A" }] } }),
    ).toBe(true);
    expect(check({ demand: [] })).toBe(false);
    expect(check({ demand: [{ quantity: "10" }] })).toBe(false);
  });

  it("is for those who have signed in", async () => {
    expect((await application("/api/openapi.json")).status).toBe(401);
  });
});
