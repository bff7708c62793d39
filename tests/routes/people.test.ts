import { beforeEach, describe, expect, it, vi } from "vitest";
import { OutboxMail } from "~/db/models/system/outbox-mail";
import type { Role } from "~/schemas/people/role";
import { startSession } from "~/services/people/start-session.server";
import { useTestDatabase } from "../support/database";
import { insertPerson } from "../support/people/insert-person";
import { makeBuild, OURS, readRoutes, startApplication } from "./application";

const database = useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

async function start() {
  const routes = await readRoutes();
  built.routes = routes;
  return startApplication(await makeBuild(routes));
}

async function cookieFor(role: Role): Promise<{ Cookie: string }> {
  const personId = await insertPerson([role], { name: `A ${role}`, email: `${role}@y.example` });
  return { Cookie: `cotterpin_session=${await startSession(personId, null)}` };
}

const form = (fields: string | string[][], headers: Record<string, string> = {}): RequestInit => ({
  method: "POST",
  headers: { ...OURS, ...headers },
  body: new URLSearchParams(fields as string[][]),
});

const PAGES = [
  "/admin/people",
  "/admin/people/1",
  "/admin/mail",
  "/admin/mail/1",
  "/admin/audit",
  "/admin/audit.csv",
];

const email = "bryn@y.example";
const INVITATION = [
  ["intent", "invite"],
  ["name", "Bryn Hale"],
  ["email", email],
  ["roles", "clerk"],
  ["roles", "builder"],
];

async function newestLink(): Promise<string> {
  const mail = await OutboxMail.findOne({ order: [["id", "DESC"]], rejectOnEmpty: true });
  return /\/(?:welcome|new-password)\/[\w-]{43}/.exec(mail.body)?.[0] ?? "none";
}

let ask: Awaited<ReturnType<typeof start>>;
let manager: { Cookie: string };
beforeEach(async () => {
  // In the demo a manager works without a second factor.
  await database.query("INSERT INTO setting (name, value) VALUES ('demo', 'true')");
  ask = await start();
  manager = await cookieFor("manager");
});

describe("the manager's pages", () => {
  it.each(["clerk", "planner", "purchaser", "builder"] as const)("are closed to the %s", async (role) => {
    const headers = await cookieFor(role);
    for (const page of PAGES) expect((await ask(page, { headers })).status).toBe(403);
    expect((await ask("/admin/people", form(INVITATION, headers))).status).toBe(403);
    expect((await ask("/admin/people/1", form([["intent", "disable"]], headers))).status).toBe(403);
    expect((await ask("/admin/mail/1", form([], headers))).status).toBe(403);
    expect(await OutboxMail.count()).toBe(0);
  });

  it("open to the manager, also where there is nothing yet", async () => {
    for (const page of ["/admin/people", "/admin/mail", "/admin/audit", "/admin/audit.csv"]) {
      expect((await ask(page, { headers: manager })).status).toBe(200);
    }
    const mails = await (await ask("/admin/mail", { headers: manager })).text();
    expect(mails).toContain("No mail yet.");
    for (const page of ["/admin/people/999", "/admin/people/x", "/admin/mail/999", "/admin/mail/x"]) {
      expect((await ask(page, { headers: manager })).status).toBe(404);
    }
  });

  it("take no button that is not there", async () => {
    for (const intent of ["toString", "constructor", ""]) {
      const answer = await ask("/admin/people/1", form([["intent", intent]], manager));
      expect(answer.status).toBe(400);
    }
  });
});

describe("an invitation", () => {
  it("goes from the form by the mail to a session of the person's own", async () => {
    const sent = await ask("/admin/people", form(INVITATION, manager));
    expect(sent.headers.get("Location")).toBe("/admin/people?done=invited");
    const link = await newestLink();
    expect(await (await ask(link)).text()).toContain("Welcome, Bryn Hale");
    const followed = await (await ask(link, { headers: manager })).text();
    expect(followed).toContain("Welcome, Bryn Hale");
    expect(followed.match(/<main/g)).toHaveLength(1);
    const short = await ask(
      link,
      form([
        ["name", "Bryn"],
        ["password", "short"],
      ]),
    );
    expect(short.status).toBe(422);
    const chosen = [
      ["name", "Bryn"],
      ["password", "wide water, slow boat"],
    ];
    const taken = await ask(link, form(chosen));
    expect(taken.status).toBe(302);
    const Cookie = (taken.headers.get("Set-Cookie") ?? "").split(";")[0];
    expect((await ask("/api/ship-line", { headers: { Cookie } })).status).toBe(200);
    expect(await (await ask(link)).text()).toContain("This link does not work any more");
    expect((await ask(link, form(chosen))).status).toBe(409);
  });

  it("says which field wants another look", async () => {
    const answer = await ask(
      "/admin/people",
      form(
        [
          ["intent", "invite"],
          ["name", ""],
          ["email", "no address"],
        ],
        manager,
      ),
    );
    expect(answer.status).toBe(422);
    const page = await answer.text();
    for (const words of ["Write a name.", "Write an e-mail address", "Give at least one role."]) {
      expect(page).toContain(words);
    }
  });
});

describe("a forgotten password", () => {
  it("gets the same page whether or not the address is known", async () => {
    await insertPerson(["clerk"], { name: "Bryn", email });
    const known = await ask("/forgotten", form([["email", email]]));
    const unknown = await ask("/forgotten", form([["email", "nobody@y.example"]]));
    expect([known.status, unknown.status]).toEqual([200, 200]);
    const plain = async (answer: Response) => (await answer.text()).replace(/nonce="[^"]*"/g, "");
    expect(await plain(unknown)).toBe(await plain(known));
    expect((await ask("/forgotten", form([["email", "x"]]))).status).toBe(422);
  });

  it("is followed by signing in again everywhere", async () => {
    const id = await insertPerson(["clerk"], { name: "Bryn", email });
    const Cookie = `cotterpin_session=${await startSession(id, null)}`;
    await ask("/forgotten", form([["email", email]], { Host: "evil.example" }));
    const [{ body }] = await OutboxMail.findAll();
    expect(body).not.toContain("evil.example");
    const link = await newestLink();
    const done = await ask(link, form([["password", "wide water, slow boat"]], { Cookie }));
    expect(done.headers.get("Location")).toBe("/sign-in?done=new-password");
    expect(done.headers.get("Set-Cookie")).toContain("Max-Age=0");
    expect((await ask("/api/ship-line", { headers: { Cookie } })).status).toBe(401);
    const signedIn = await ask(
      "/sign-in",
      form([
        ["email", email],
        ["password", "wide water, slow boat"],
      ]),
    );
    expect(signedIn.status).toBe(302);
  });
});

describe("mail", () => {
  const insert = (state: string) =>
    database.query(
      "INSERT INTO outbox (message_id, to_address, subject, body, state, tries, fault) VALUES ('<1@y>', 'a@y.example', 'A part has come', 'Go to http://h/welcome/secret-secret now.', ?, 8, 'letter box full')",
      [state],
    );

  it("that was given up is tried again when the manager says so, once", async () => {
    await insert("dead");
    const list = await (await ask("/admin/mail", { headers: manager })).text();
    expect(list).toContain("given up after 8 tries");
    expect(list).toContain("letter box full");
    expect((await ask("/admin/mail/1", form([], manager))).status).toBe(302);
    expect(await OutboxMail.findByPk(1)).toMatchObject({ state: "waiting", tries: 0 });
    expect((await ask("/admin/mail/1", form([], manager))).status).toBe(409);
  });

  it("shows its link in the local mailbox, and to nobody once it has left", async () => {
    await insert("caught");
    expect(await (await ask("/admin/mail/1", { headers: manager })).text()).toContain("secret-secret");
    await database.query("UPDATE outbox SET state = 'sent'");
    expect(await (await ask("/admin/mail/1", { headers: manager })).text()).not.toContain("secret-secret");
  });
});
