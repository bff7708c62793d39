import { beforeEach, describe, expect, it } from "vitest";
import { ApiToken } from "~/db/models/people/api-token";
import { AuditEvent } from "~/db/models/system/audit-event";
import type { Role } from "~/schemas/people/role";
import { findAsker } from "~/services/people/find-asker.server";
import { changeRoles } from "~/services/people/manage/change-roles.server";
import { disablePerson } from "~/services/people/manage/disable-person.server";
import { enablePerson } from "~/services/people/manage/enable-person.server";
import { endTheirSession } from "~/services/people/manage/end-their-session.server";
import { endTheirToken } from "~/services/people/manage/end-their-token.server";
import { findPeople } from "~/services/people/manage/find-people.server";
import { getPersonPage } from "~/services/people/manage/get-person-page.server";
import { invitePerson } from "~/services/people/manage/invite-person.server";
import { resendInvitation } from "~/services/people/manage/resend-invitation.server";
import { hashSecret } from "~/services/people/secret.server";
import { startSession } from "~/services/people/start-session.server";
import { useTestDatabase } from "../../support/database";
import { asActor } from "../../support/people/as-actor";
import { insertPerson } from "../../support/people/insert-person";

const database = useTestDatabase();

let greta: number;
let wren: number;
beforeEach(async () => {
  greta = await insertPerson(["manager"], { name: "Greta Lindqvist", email: "greta@saltmarsh.example" });
  wren = await insertPerson(["clerk"]);
});

const bySession = (id: string) =>
  findAsker(new Headers({ Cookie: `cotterpin_session=${id}` }), { tokens: false });
const byToken = (token: string) =>
  findAsker(new Headers({ Authorization: `Bearer ${token}` }), { tokens: true });

async function giveToken(personId: number, token: string): Promise<number> {
  return (await ApiToken.create({ tokenHash: hashSecret(token), personId, name: `for ${token}` })).id;
}

const LAST = { code: "conflict", message: expect.stringContaining("Nobody would be left") };

describe("roles", () => {
  it("change, are written into the audit, and end the sessions begun under the old ones", async () => {
    const session = await startSession(wren, null);
    await changeRoles(wren, { roles: ["planner", "builder"] }, asActor(greta));
    expect(await bySession(session)).toBeNull();
    const asked = await bySession(await startSession(wren, null));
    expect(asked?.roles.sort()).toEqual(["builder", "planner"]);
    const event = await AuditEvent.findOne({ where: { subject: `person ${wren}` } });
    expect(event).toMatchObject({
      actorId: greta,
      act: "people",
      before: { roles: ["clerk"] },
      after: { roles: ["planner", "builder"] },
    });
  });

  it("stay as they are, with the sessions, when nothing is changed", async () => {
    const session = await startSession(wren, null);
    await changeRoles(wren, { roles: ["clerk"] }, asActor(greta));
    expect(await bySession(session)).not.toBeNull();
    expect(await AuditEvent.count()).toBe(0);
  });

  it.each([{ roles: [] }, { roles: ["owner"] }, {}])("are refused as %j", async (input) => {
    await expect(changeRoles(wren, input, asActor(greta))).rejects.toMatchObject({ code: "invalid" });
  });
});

describe("keeping somebody out", () => {
  it("ends sessions and tokens at once and for good", async () => {
    const session = await startSession(wren, null);
    await giveToken(wren, "kept-by-a-script");
    expect(await byToken("kept-by-a-script")).not.toBeNull();
    await disablePerson(wren, asActor(greta));
    expect(await bySession(session)).toBeNull();
    expect(await byToken("kept-by-a-script")).toBeNull();
    await enablePerson(wren, asActor(greta));
    expect(await bySession(session)).toBeNull();
    expect(await byToken("kept-by-a-script")).toBeNull();
    expect(await bySession(await startSession(wren, null))).not.toBeNull();
  });
});

describe("the last manager", () => {
  it("keeps place and role, and their session", async () => {
    const session = await startSession(greta, null);
    await expect(disablePerson(greta, asActor(greta))).rejects.toMatchObject(LAST);
    await expect(changeRoles(greta, { roles: ["clerk"] }, asActor(greta))).rejects.toMatchObject(LAST);
    expect((await bySession(session))?.roles).toEqual(["manager"]);
    expect(await AuditEvent.count()).toBe(0);
  });

  it("is not one who has yet to accept, nor one who is kept out", async () => {
    const invited = await invitePerson(
      { name: "Bryn", email: "bryn@y.example", roles: ["manager"] },
      asActor(greta),
    );
    await expect(disablePerson(greta, asActor(greta))).rejects.toMatchObject(LAST);
    await disablePerson(invited, asActor(greta));
    await expect(disablePerson(greta, asActor(greta))).rejects.toMatchObject(LAST);
  });

  it("is left when both managers are kept out at the same time", async () => {
    const other = await insertPerson(["manager"], { name: "Odd", email: "odd@saltmarsh.example" });
    for (let round = 0; round < 10; round++) {
      const ends = await Promise.allSettled([
        disablePerson(greta, asActor(wren)),
        disablePerson(other, asActor(wren)),
      ]);
      expect(ends.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected"]);
      await database.query("UPDATE person SET disabled_at = NULL");
    }
  });
});

describe("what the manager sees", () => {
  it("is everybody with roles, place and when they were last here", async () => {
    await startSession(wren, null);
    const bryn = await invitePerson(
      { name: "Bryn", email: "bryn@y.example", roles: ["builder"] },
      asActor(greta),
    );
    await disablePerson(wren, asActor(greta));
    const people = await findPeople();
    expect(people.map(({ id, state, roles }) => [id, state, roles])).toEqual([
      [bryn, "invited", ["builder"]],
      [greta, "in", ["manager"]],
      [wren, "disabled", ["clerk"]],
    ]);
    expect(people.find(({ id }) => id === bryn)?.seenAt).toBeNull();
    const seen = (await findPeople()).find(({ id }) => id === greta)?.seenAt;
    expect(Math.abs(Date.parse(seen ?? "") - Date.now())).toBeLessThan(60_000);
  });

  it("is a person's sessions and tokens, to end one by one", async () => {
    const sessions = [await startSession(wren, null), await startSession(wren, null)];
    const tokenId = await giveToken(wren, "kept-by-a-script");
    const page = await getPersonPage(wren);
    expect(page.sessions).toHaveLength(2);
    expect(page.tokens).toMatchObject([{ id: tokenId, name: "for kept-by-a-script" }]);
    expect(JSON.stringify(page)).not.toContain(hashSecret(sessions[0]));
    await endTheirSession(wren, hashSecret(sessions[0]).slice(0, 16), asActor(greta));
    expect(await bySession(sessions[0])).toBeNull();
    expect(await bySession(sessions[1])).not.toBeNull();
    await endTheirToken(wren, tokenId, asActor(greta));
    expect(await byToken("kept-by-a-script")).toBeNull();
    await expect(endTheirToken(wren, tokenId, asActor(greta))).rejects.toMatchObject({ code: "not-found" });
    expect(await AuditEvent.count({ where: { subject: `person ${wren}` } })).toBe(2);
  });

  it("lets nobody's session or token be ended under another person", async () => {
    const session = await startSession(wren, null);
    const tokenId = await giveToken(wren, "kept-by-a-script");
    for (const key of [hashSecret(session).slice(0, 16), "", "%"]) {
      await expect(endTheirSession(greta, key, asActor(greta))).rejects.toMatchObject({ code: "not-found" });
    }
    await expect(endTheirToken(greta, tokenId, asActor(greta))).rejects.toMatchObject({ code: "not-found" });
    await expect(endTheirToken(null, tokenId, asActor(greta))).rejects.toMatchObject({ code: "not-found" });
    expect(await bySession(session)).not.toBeNull();
  });

  it("is a sentence where there is nobody", async () => {
    await expect(getPersonPage(999)).rejects.toMatchObject({ code: "not-found" });
  });
});

describe("who may", () => {
  const acts: [string, (id: number, actor: ReturnType<typeof asActor>) => Promise<unknown>][] = [
    ["invite", (_id, actor) => invitePerson({ name: "X", email: "x@y.example", roles: ["clerk"] }, actor)],
    ["change roles", (id, actor) => changeRoles(id, { roles: ["manager"] }, actor)],
    ["keep out", disablePerson],
    ["let in", enablePerson],
    ["invite again", resendInvitation],
    ["end a session", (id, actor) => endTheirSession(id, "0123456789abcdef", actor)],
    ["end a token", (id, actor) => endTheirToken(id, 1, actor)],
  ];
  const others: Role[] = ["clerk", "planner", "purchaser", "builder"];

  it.each(acts)("%s: the manager alone", async (_name, act) => {
    await expect(act(wren, asActor(wren, others))).rejects.toMatchObject({ code: "forbidden" });
    expect(await AuditEvent.count()).toBe(0);
  });
});
