import { describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { createToken } from "~/services/people/create-token.server";
import {
  apiAction,
  apiLoader,
  guardedAction,
  guardedLoader,
  publicLoader,
} from "~/services/people/guard.server";
import { startSession } from "~/services/people/start-session.server";
import { AppError } from "~/utils/errors";
import { readJson } from "~/utils/request-body";
import { useTestDatabase } from "../support/database";
import { insertPerson } from "../support/people/insert-person";
import { makeBuild, OURS, readRoutes, startApplication } from "./application";

const database = useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

const effects: string[] = [];

function Page() {
  return "page";
}

/** The application with a few routes of the test beside its own. */
async function start() {
  const own = await readRoutes();
  const add = (path: string, module: object) => {
    own[path] = { id: path, parentId: "root", path, module };
  };
  add("plans", { default: Page, loader: guardedLoader("look", (_args, person) => ({ hello: person.name })) });
  add("approve", {
    default: Page,
    loader: guardedLoader("look", () => null),
    action: guardedAction("approve-count", async ({ request }) => {
      effects.push(String((await request.formData()).get("what")));
      return null;
    }),
  });
  add("broken", {
    default: Page,
    loader: publicLoader(() => {
      throw new Error("SELECT secret FROM person");
    }),
  });
  add("forgotten", {
    loader: () => Response.json({ secret: true }),
    action: () => effects.push("forgotten"),
  });
  add("half-forgotten", { loader: publicLoader(() => null), action: () => effects.push("half-forgotten") });
  add("no-loader", { default: Page });
  add("api/look", { loader: apiLoader("look", (_args, person) => ({ roles: person.roles })) });
  add("api/costs", { loader: apiLoader("see-costs", () => ({ cost: "1.00" })) });
  add("api/errors/:code", {
    loader: apiLoader("look", ({ params }) => {
      if (params.code === "database")
        throw Object.assign(new Error("secret"), { name: "SequelizeConnectionRefusedError" });
      if (params.code === "fault") throw new Error("SELECT secret FROM person");
      throw new AppError(params.code as "busy", "A sentence.", {
        errors: [{ line: 3, column: "part_number", message: "Which?" }],
      });
    }),
  });
  add("api/note", {
    action: apiAction("look", async ({ request }) => {
      const { note } = await readJson(request, z.object({ note: z.string("Write a note.") }));
      effects.push(note);
      return Response.json({ length: note.length }, { status: 201 });
    }),
  });
  add("api/csv", {
    action: apiAction("look", async ({ request }) => ({ length: (await request.text()).length }), [
      "text/csv",
    ]),
  });
  built.routes = own;
  effects.length = 0;
  return startApplication(await makeBuild(own));
}

async function cookieFor(role: "clerk" | "planner"): Promise<{ Cookie: string }> {
  const personId = await insertPerson([role], { name: "Somebody", email: `${role}@y.example` });
  return { Cookie: `cotterpin_session=${await startSession(personId, null)}` };
}

describe("the guard of pages", () => {
  it("sends strangers to sign in, with the way back", async () => {
    const ask = await start();
    const answer = await ask("/plans?kit=S2&n=10");
    expect(answer.status).toBe(302);
    expect(answer.headers.get("Location")).toBe(`/sign-in?to=${encodeURIComponent("/plans?kit=S2&n=10")}`);
  });

  it("does so for data requests too", async () => {
    const ask = await start();
    const answer = await ask("/plans.data?kit=S2");
    expect(answer.status).toBe(202);
    expect(await answer.text()).toContain("/sign-in?to=%2Fplans%3Fkit%3DS2");
  });

  it("lets people in who may, and tells the others who can", async () => {
    const ask = await start();
    const headers = await cookieFor("clerk");
    expect((await ask("/plans", { headers })).status).toBe(200);
    const body = new URLSearchParams({ what: "count 7" });
    const refused = await ask("/approve", { method: "POST", headers: { ...headers, ...OURS }, body });
    expect(refused.status).toBe(403);
    const page = await refused.text();
    expect(page).toContain("This is for the planner or manager.");
    expect(page).toContain("You are here as stock clerk.");
    expect(effects).toEqual([]);
    const may = { ...(await cookieFor("planner")), ...OURS };
    expect((await ask("/approve", { method: "POST", headers: may, body })).status).toBe(200);
    expect(effects).toEqual(["count 7"]);
  });

  it("takes forms alone", async () => {
    const ask = await start();
    const headers = { ...(await cookieFor("planner")), ...OURS, "Content-Type": "application/json" };
    expect((await ask("/approve", { method: "POST", headers, body: "{}" })).status).toBe(415);
    expect(effects).toEqual([]);
  });

  it("shows a fault as a sentence with the request's number", async () => {
    const ask = await start();
    const answer = await ask("/broken");
    const page = await answer.text();
    expect(answer.status).toBe(500);
    expect(page).toContain(answer.headers.get("X-Request-Id"));
    expect(page).not.toContain("SELECT");
  });

  it.each(["forgotten", "half-forgotten", "no-loader"])(
    "refuses the route %s, which does not say its act",
    async (path) => {
      const ask = await start();
      const headers = { ...(await cookieFor("planner")), ...OURS };
      for (const address of [`/${path}`, `/${path}/`, `/${path}.data`]) {
        expect((await ask(address, { headers })).status).toBe(403);
        const body = new URLSearchParams();
        expect((await ask(address, { method: "POST", headers, body })).status).toBe(403);
      }
      expect(effects).toEqual([]);
    },
  );
});

describe("the guard of JSON routes", () => {
  it("answers 401 and 403 as problems", async () => {
    const ask = await start();
    const stranger = await ask("/api/look");
    expect(stranger.status).toBe(401);
    expect(stranger.headers.get("Content-Type")).toContain("application/problem+json");
    const refused = await ask("/api/costs", { headers: await cookieFor("clerk") });
    expect(refused.status).toBe(403);
    expect(await refused.json()).toMatchObject({
      type: "urn:cotterpin:problem:forbidden",
      title: "Not among your rights",
      status: 403,
      detail: "This is for the planner, purchaser or manager. You are here as stock clerk.",
    });
  });

  it("takes tokens", async () => {
    const ask = await start();
    const token = await createToken({ role: "purchaser", name: "x" });
    const answer = await ask("/api/costs", { headers: { Authorization: `Bearer ${token}` } });
    expect(await answer.json()).toEqual({ cost: "1.00" });
    expect(answer.headers.get("Cache-Control")).toBe("private, no-store");
    const page = await ask("/plans", { headers: { Authorization: `Bearer ${token}` } });
    expect(page.status).toBe(302);
  });

  it.each([
    ["bad-request", 400],
    ["not-found", 404],
    ["conflict", 409],
    ["invalid", 422],
    ["too-many", 429],
    ["busy", 503],
    ["database", 503],
    ["fault", 500],
  ])("turns %s into %i", async (code, status) => {
    const ask = await start();
    const answer = await ask(`/api/errors/${code}`, { headers: await cookieFor("clerk") });
    const problem = await answer.json();
    expect(answer.status).toBe(status);
    expect(problem.status).toBe(status);
    expect(Object.keys(problem)).toEqual(expect.arrayContaining(["type", "title", "status", "detail"]));
    expect(answer.headers.has("Retry-After")).toBe(status === 429 || status === 503);
    expect(JSON.stringify(problem)).not.toContain("secret");
    if (status < 500) expect(problem.errors).toEqual([{ line: 3, column: "part_number", message: "Which?" }]);
    if (status === 500) expect(problem.requestId).toBe(answer.headers.get("X-Request-Id"));
  });

  it("answers problems where nothing is and where the method is another", async () => {
    const ask = await start();
    const headers = { ...(await cookieFor("clerk")), ...OURS };
    const nowhere = await ask("/api/nowhere");
    expect([nowhere.status, nowhere.headers.get("Content-Type")]).toEqual([
      404,
      "application/problem+json; charset=utf-8",
    ]);
    const other = await ask("/api/look", { method: "DELETE", headers });
    expect([other.status, (await other.json()).status]).toEqual([405, 405]);
    const get = await ask("/api/note", { headers });
    expect(get.headers.get("Content-Type")).toContain("application/problem+json");
  });
});

describe("bodies", () => {
  async function post(path: string, type: string, body: BodyInit) {
    const ask = await start();
    const token = await createToken({ role: "clerk", name: "x" });
    const headers = { Authorization: `Bearer ${token}`, "Content-Type": type };
    return ask(path, { method: "POST", headers, body, duplex: "half" } as RequestInit);
  }

  function stream(bytes: number): ReadableStream {
    const chunk = new Uint8Array(64 * 1024).fill(97);
    let sent = 0;
    return new ReadableStream({
      pull(controller) {
        if (sent >= bytes) return controller.close();
        sent += chunk.byteLength;
        controller.enqueue(chunk);
      },
    });
  }

  it("are read as JSON and checked", async () => {
    const good = await post("/api/note", "application/json; charset=utf-8", '{"note":"hello"}');
    expect([good.status, await good.json()]).toEqual([201, { length: 5 }]);
    expect(effects).toEqual(["hello"]);
    expect((await post("/api/note", "application/json", '{"note":')).status).toBe(400);
    const wrong = await post("/api/note", "application/json", '{"note":7}');
    expect(wrong.status).toBe(422);
    expect((await wrong.json()).errors).toEqual([{ field: "note", message: "Write a note." }]);
  });

  it.each(["text/plain", "application/x-www-form-urlencoded", "text/csv", ""])(
    "of type '%s' are no JSON",
    async (type) => {
      const answer = await post("/api/note", type, '{"note":"hello"}');
      expect(answer.status).toBe(415);
      expect(effects).toEqual([]);
    },
  );

  it("are refused past 1 MB while they stream, also when no length is told", async () => {
    const answer = await post("/api/note", "application/json", stream(3 * 1024 * 1024));
    expect(answer.status).toBe(413);
    expect((await answer.json()).detail).toContain("1 MB");
  });

  it("may have 20 MB as CSV, and no more", async () => {
    const fits = await post("/api/csv", "text/csv", stream(19 * 1024 * 1024));
    expect(fits.status).toBe(200);
    expect((await post("/api/csv", "text/csv", stream(21 * 1024 * 1024))).status).toBe(413);
  });
});

describe("where changes come from", () => {
  const cases: [string, Record<string, string>, boolean][] = [
    ["our own page", OURS, true],
    ["our own page, by Sec-Fetch-Site", { "Sec-Fetch-Site": "same-origin" }, true],
    ["another site", { Origin: "http://other.example" }, false],
    ["another port", { Origin: "http://shop.example:81" }, false],
    ["another scheme", { Origin: "https://shop.example" }, false],
    ["a name that begins like ours", { Origin: "http://shop.example.evil.example" }, false],
    ["null", { Origin: "null" }, false],
    ["nowhere", {}, false],
    ["a sibling", { "Sec-Fetch-Site": "same-site" }, false],
    ["an address bar", { "Sec-Fetch-Site": "none" }, false],
    ["another site that calls itself ours", { ...OURS, "Sec-Fetch-Site": "cross-site" }, false],
  ];

  it.each(cases)("%s", async (_name, headers, allowed) => {
    const ask = await start();
    const all = { ...(await cookieFor("planner")), ...headers };
    const body = new URLSearchParams({ what: "x" });
    const page = await ask("/approve", { method: "POST", headers: all, body });
    const data = await ask("/approve.data", { method: "POST", headers: all, body });
    const json = await ask("/api/note", {
      method: "POST",
      headers: { ...all, "Content-Type": "application/json" },
      body: '{"note":"y"}',
    });
    expect([page.status < 400, data.status < 400, json.status < 400]).toEqual([allowed, allowed, allowed]);
    expect(effects).toEqual(allowed ? ["x", "x", "y"] : []);
  });

  it("a token alone is enough for JSON, and never for pages", async () => {
    const ask = await start();
    const token = await createToken({ role: "planner", name: "x" });
    const headers = { Authorization: `Bearer ${token}`, ...(await cookieFor("planner")) };
    const json = await ask("/api/note", {
      method: "POST",
      headers: { ...headers, "Content-Type": "application/json" },
      body: '{"note":"y"}',
    });
    expect(json.status).toBe(201);
    const page = await ask("/approve", { method: "POST", headers, body: new URLSearchParams({ what: "x" }) });
    expect(page.status).toBe(403);
    expect(effects).toEqual(["y"]);
  });
});

describe("headers", () => {
  it.each(["/sign-in", "/nowhere", "/api/health", "/api/look", "/plans", "/forgotten"])(
    "of %s are safe",
    async (path) => {
      await database.query("INSERT INTO setting (name, value) VALUES ('demo', 'true')");
      const ask = await start();
      const { headers } = await ask(path);
      const policy = headers.get("Content-Security-Policy") ?? "";
      for (const part of [
        "object-src 'none'",
        "base-uri 'none'",
        "frame-ancestors 'none'",
        "script-src 'self' 'nonce-",
      ]) {
        expect(policy).toContain(part);
      }
      expect(policy).not.toMatch(/script-src[^;]*unsafe/);
      expect(headers.get("X-Content-Type-Options")).toBe("nosniff");
      expect(headers.get("Referrer-Policy")).toBe("same-origin");
      expect(headers.get("Cache-Control")).toContain("no-store");
    },
  );

  it("carry a new nonce each time, which all scripts of the page have", async () => {
    await database.query("INSERT INTO setting (name, value) VALUES ('demo', 'true')");
    const ask = await start();
    const nonces = new Set<string>();
    for (let n = 0; n < 2; n++) {
      const answer = await ask("/sign-in");
      const nonce =
        /'nonce-([^']+)'/.exec(answer.headers.get("Content-Security-Policy") ?? "")?.[1] ?? "none";
      const scripts = (await answer.text()).match(/<script[^>]*>/g) ?? [];
      expect(scripts.length).toBeGreaterThan(1);
      expect(scripts.filter((script) => !script.includes(`nonce="${nonce}"`))).toEqual([]);
      nonces.add(nonce);
    }
    expect(nonces.size).toBe(2);
  });
});
