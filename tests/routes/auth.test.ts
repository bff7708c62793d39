import { beforeEach, describe, expect, it, vi } from "vitest";
import { DEMO_PASSWORD, DEMO_PEOPLE } from "~/services/people/demo-people";
import { isDeclared } from "~/services/people/find-undeclared.server";
import { makeSetupCode } from "~/services/people/make-setup-code.server";
import { useTestDatabase } from "../support/database";
import { insertPerson, PASSWORD } from "../support/people/insert-person";
import { makeBuild, OURS, readRoutes, startApplication } from "./application";

const database = useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

const email = "greta@saltmarsh.example";
const password = PASSWORD;

async function start() {
  const routes = await readRoutes();
  built.routes = routes;
  return startApplication(await makeBuild(routes));
}

function form(fields: Record<string, string>, headers: Record<string, string> = {}): RequestInit {
  return { method: "POST", headers: { ...OURS, ...headers }, body: new URLSearchParams(fields) };
}

function cookieOf(answer: Response): string {
  return (answer.headers.get("Set-Cookie") ?? "").split(";")[0];
}

describe("every route", async () => {
  const routes = Object.values(await readRoutes());

  it.each(routes.map((route) => [route.id, route] as const))("%s declares who may use it", (_id, route) => {
    expect(isDeclared(route.module, route.id === "root")).toBe(true);
  });

  it("is open to all only where signing in needs it", () => {
    const open = routes.filter(({ module }) =>
      [module.loader, module.action].some((part) => part?.act === "public"),
    );
    expect(open.map(({ id }) => id).sort()).toEqual([
      "root",
      "routes/api/health",
      "routes/auth/forgotten",
      "routes/auth/new-password",
      "routes/auth/set-up",
      "routes/auth/sign-in",
      "routes/auth/sign-in-code",
      "routes/auth/sign-out",
      "routes/auth/welcome",
      "routes/not-found",
    ]);
  });

  it("keeps strangers out, by every method, as page and as data", async () => {
    await insertPerson(["manager"], { name: "Greta Lindqvist", email });
    const ask = await start();
    const patterns = routes.map((route) => ({
      route,
      address: `/${route.path ?? ""}`.replace(/:\w+\??/g, "x"),
    }));
    const closed = patterns.filter(
      ({ route }) => route.module.loader?.act !== "public" && route.id !== "root",
    );
    expect(closed.length).toBeGreaterThan(0);
    for (const { route, address } of closed) {
      for (const path of [address, address === "/" ? "/_.data" : `${address}.data`]) {
        for (const method of ["GET", "POST", "PUT", "PATCH", "DELETE"]) {
          if (method === "GET" && route.module.loader === undefined) continue;
          const headers = { ...OURS, "Content-Type": "application/x-www-form-urlencoded" };
          const answer = await ask(path, { method, headers, body: method === "GET" ? undefined : "" });
          const sentAway = [202, 302].includes(answer.status)
            ? (answer.headers.get("Location") ?? (await answer.text())).includes("/sign-in")
            : [401, 403, 404, 405].includes(answer.status);
          expect(sentAway, `${method} ${path} answered ${answer.status}`).toBe(true);
        }
      }
    }
  });
});

describe("signing in", () => {
  beforeEach(async () => {
    await insertPerson(["manager"], { name: "Greta Lindqvist", email });
  });

  it("gives a session under a new id and takes the person where they wanted to go", async () => {
    const ask = await start();
    const planted = `cotterpin_session=${"A".repeat(43)}`;
    const answer = await ask(
      "/sign-in?to=%2Fcheck%3Fkit%3DS2",
      form({ email: " Greta@Saltmarsh.example", password }, { Cookie: planted }),
    );
    expect(answer.status).toBe(302);
    expect(answer.headers.get("Location")).toBe("/check?kit=S2");
    expect(answer.headers.get("Set-Cookie")).toMatch(
      /^cotterpin_session=[\w-]{43}; Path=\/; Max-Age=604800; HttpOnly; SameSite=Lax$/,
    );
    expect(cookieOf(answer)).not.toBe(planted);
    const start_ = await ask("/", { headers: { Cookie: cookieOf(answer) } });
    expect([start_.status, start_.headers.get("Location")]).toEqual([302, "/account"]);
    const again = await ask("/sign-in", { headers: { Cookie: cookieOf(answer) } });
    expect(again.headers.get("Location")).toBe("/");
  });

  it.each([
    "https://evil.example/",
    "//evil.example/",
    "/\\evil.example",
    "\\\\evil.example",
    "/\t/evil.example",
    "javascript:alert(1)",
    "check",
    "",
  ])("never leads to %j", async (to) => {
    const ask = await start();
    const answer = await ask(`/sign-in?to=${encodeURIComponent(to)}`, form({ email, password }));
    expect([answer.status, answer.headers.get("Location")]).toEqual([302, "/"]);
  });

  it("answers a wrong password with a sentence and no cookie", async () => {
    const ask = await start();
    const answer = await ask("/sign-in", form({ email, password: "wrong" }));
    expect(answer.status).toBe(422);
    expect(answer.headers.has("Set-Cookie")).toBe(false);
    expect(await answer.text()).toContain("do not go together");
  });

  it.each([
    [{}, ["Write your e-mail address.", "Write your password."]],
    [{ email: "" }, ["Write your e-mail address."]],
    [{ email, password: "x".repeat(1001) }, ["That is too long for a password."]],
  ])("names the fields of %j", async (fields, sentences) => {
    const ask = await start();
    const answer = await ask("/sign-in", form(fields as Record<string, string>));
    const page = await answer.text();
    expect(answer.status).toBe(422);
    for (const sentence of sentences) expect(page).toContain(sentence);
  });

  it.each(["application/json", "text/plain", "image/png"])(
    "answers 415 to a body of type %s",
    async (type) => {
      const ask = await start();
      const answer = await ask("/sign-in", {
        method: "POST",
        headers: { ...OURS, "Content-Type": type },
        body: "{}",
      });
      expect(answer.status).toBe(415);
    },
  );

  it("does not choke on a file or a broken form", async () => {
    const ask = await start();
    const body = new FormData();
    body.set("email", new File(["x"], "email.txt"));
    body.set("password", "x");
    expect((await ask("/sign-in", { method: "POST", headers: OURS, body })).status).toBe(422);
    const broken = { ...OURS, "Content-Type": "multipart/form-data; boundary=x" };
    expect((await ask("/sign-in", { method: "POST", headers: broken, body: "no parts" })).status).toBe(400);
  });

  it("says when to come back after ten wrong passwords", async () => {
    await database.query(
      "INSERT INTO sign_in_attempt (account_key, address, succeeded) SELECT SHA2(?, 256), 'there', 0 FROM seq_1_to_10",
      [email],
    );
    const ask = await start();
    const answer = await ask("/sign-in", form({ email, password }));
    expect(answer.status).toBe(429);
    expect(Number(answer.headers.get("Retry-After"))).toBeGreaterThan(800);
    expect(await answer.text()).toContain("Too many tries. Wait 15 minutes, then try again.");
  });
});

describe("signing out", () => {
  it("ends the session and takes the cookie away", async () => {
    await insertPerson(["manager"], { name: "Greta Lindqvist", email });
    const ask = await start();
    const Cookie = cookieOf(await ask("/sign-in", form({ email, password })));
    expect((await ask("/sign-out", { headers: { Cookie } })).headers.get("Location")).toBe("/");
    expect((await ask("/", { headers: { Cookie } })).headers.get("Location")).toBe("/account");
    const out = await ask("/sign-out", form({}, { Cookie }));
    expect([out.status, out.headers.get("Location")]).toEqual([302, "/sign-in"]);
    expect(out.headers.get("Set-Cookie")).toContain("Max-Age=0");
    expect((await ask("/", { headers: { Cookie } })).headers.get("Location")).toBe("/sign-in");
  });
});

describe("a manager without a second factor", () => {
  it("comes to their account and nowhere else, except in the demo", async () => {
    await insertPerson(["manager"], { name: "Greta Lindqvist", email });
    const ask = await start();
    const Cookie = cookieOf(await ask("/sign-in", form({ email, password })));
    const go = (path: string) => ask(path, { headers: { Cookie } });
    for (const path of ["/", "/check", "/admin/people"])
      expect((await go(path)).headers.get("Location")).toBe("/account");
    expect((await go("/api/parts")).status).toBe(403);
    const page = await go("/account");
    expect([page.status, await page.text()]).toEqual([
      200,
      expect.stringContaining("set up a second factor"),
    ]);
    const token = await ask(
      "/account",
      form({ intent: "make-token", name: "x", role: "manager" }, { Cookie }),
    );
    expect(token.status).toBe(409);
    await database.query("INSERT INTO setting (name, value) VALUES ('demo', 'true')");
    expect((await go("/")).headers.get("Location")).toBe("/check");
    expect((await go("/api/parts")).status).toBe(200);
  });
});

describe("the first visitor", () => {
  it("is led to set up the shop, becomes the manager, and nobody after", async () => {
    const ask = await start();
    expect((await ask("/sign-in")).headers.get("Location")).toBe("/set-up");
    const code = (await makeSetupCode()) ?? "";
    const fields = { code, name: "Greta Lindqvist", email, password };
    const wrong = await ask("/set-up", form({ ...fields, code: "AAAA" }));
    expect(wrong.status).toBe(422);
    expect(await wrong.text()).toContain("This is not the code");
    const done = await ask("/set-up", form(fields));
    expect([done.status, done.headers.get("Location")]).toEqual([302, "/"]);
    expect((await ask("/", { headers: { Cookie: cookieOf(done) } })).headers.get("Location")).toBe(
      "/account",
    );
    expect((await ask("/set-up")).headers.get("Location")).toBe("/");
    const late = await ask("/set-up", form({ ...fields, email: "late@y.example" }));
    expect(late.headers.has("Set-Cookie")).toBe(false);
    expect(await database.query("SELECT email FROM person")).toEqual([{ email }]);
  });
});

describe("the demo", () => {
  it("lets each of the five in by the button with their name", async () => {
    await database.query("INSERT INTO setting (name, value) VALUES ('demo', 'true')");
    for (const { role, ...person } of DEMO_PEOPLE) await insertPerson([role], person);
    const ask = await start();
    const page = await (await ask("/sign-in")).text();
    for (const person of DEMO_PEOPLE) {
      expect(page).toContain(person.name);
      expect(page).toContain(`value="${person.email}"`);
      const answer = await ask("/sign-in", form({ email: person.email, password }));
      expect(answer.headers.get("Location")).toBe("/");
    }
  });

  it("shows no password outside the demo", async () => {
    await insertPerson(["manager"], { name: "Greta Lindqvist", email });
    const ask = await start();
    expect(await (await ask("/sign-in")).text()).not.toContain(DEMO_PASSWORD);
  });
});

describe("health", () => {
  it("tells of database, revision and migrations, and says no while draining", async () => {
    const ask = await start();
    const well = await ask("/api/health");
    expect(well.status).toBe(200);
    expect(await well.json()).toMatchObject({
      status: "ok",
      database: "reachable",
      revision: 3,
      migrations: { pending: [] },
    });
    globalThis.__cotterpinDraining = true;
    try {
      const leaving = await ask("/api/health", { headers: { Authorization: "Bearer wrong" } });
      expect([leaving.status, (await leaving.json()).status]).toEqual([503, "draining"]);
    } finally {
      globalThis.__cotterpinDraining = undefined;
    }
  });
});
