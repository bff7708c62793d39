import { describe, expect, it } from "vitest";
import { changePassword } from "~/services/people/account/change-password.server";
import { endOwnSessions } from "~/services/people/account/end-own-sessions.server";
import { getAccount } from "~/services/people/account/get-account.server";
import { makeOwnToken } from "~/services/people/account/make-own-token.server";
import { withdrawOwnToken } from "~/services/people/account/withdraw-own-token.server";
import { checkCredentials } from "~/services/people/check-credentials.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { findAsker } from "~/services/people/find-asker.server";
import { disablePerson } from "~/services/people/manage/disable-person.server";
import { startSession } from "~/services/people/start-session.server";
import { useTestDatabase } from "../../../support/database";
import { insertPerson, PASSWORD } from "../../../support/people/insert-person";

const database = useTestDatabase();

const email = "wren@saltmarsh.example";
const address = "192.0.2.7";
const NEW = "seven hulls on the slip";

const bySession = (id: string) =>
  findAsker(new Headers({ Cookie: `cotterpin_session=${id}` }), { tokens: false });
const byToken = (token: string) =>
  findAsker(new Headers({ Authorization: `Bearer ${token}` }), { tokens: true });

/** Wren, signed in twice. */
async function signedInTwice(roles: CurrentPerson["roles"] = ["clerk", "builder"]) {
  const personId = await insertPerson(roles);
  const sessionId = await startSession(personId, null);
  const other = await startSession(personId, null);
  const person = await bySession(sessionId);
  if (!person) throw new Error("Nobody is signed in.");
  return { person, personId, sessionId, other };
}

describe("changing the password", () => {
  it("ends every other session at once and goes on in this one", async () => {
    const { person, personId, sessionId, other } = await signedInTwice();
    expect(await changePassword({ present: PASSWORD, password: NEW }, person, { sessionId, address })).toBe(
      1,
    );
    expect(await bySession(other)).toBeNull();
    expect(await bySession(sessionId)).not.toBeNull();
    expect(await checkCredentials({ email, password: NEW, address })).toBe(personId);
    await expect(checkCredentials({ email, password: PASSWORD, address })).rejects.toMatchObject({
      code: "invalid",
    });
    const audit = await database.query("SELECT * FROM audit_event");
    expect(JSON.stringify(audit)).not.toContain(NEW);
  });

  it("asks for the present password and counts the tries", async () => {
    const { person, sessionId } = await signedInTwice();
    const attempt = () => changePassword({ present: "wrong", password: NEW }, person, { sessionId, address });
    await expect(attempt()).rejects.toMatchObject({ code: "invalid", errors: [{ field: "present" }] });
    await database.query("UPDATE sign_in_attempt SET at = NOW(3)");
    for (let n = 0; n < 9; n++) await expect(attempt()).rejects.toMatchObject({ code: "invalid" });
    await expect(attempt()).rejects.toMatchObject({ code: "too-many" });
  });

  it.each(["short", "password1234", "a tide over the wide marsh, ".repeat(3)])(
    "refuses %s as the new one",
    async (password) => {
      const { person, sessionId } = await signedInTwice();
      await expect(
        changePassword({ present: PASSWORD, password }, person, { sessionId, address }),
      ).rejects.toMatchObject({ code: "invalid", errors: [{ field: "password" }] });
    },
  );
});

describe("one's own sessions", () => {
  it("are listed with this one marked, and end at once", async () => {
    const { person, sessionId, other } = await signedInTwice();
    const { sessions } = await getAccount(person, sessionId);
    expect(sessions.map(({ isThis }) => isThis).sort()).toEqual([false, true]);
    const key = sessions.find(({ isThis }) => !isThis)?.key ?? "";
    await endOwnSessions({ key }, person, sessionId);
    expect(await bySession(other)).toBeNull();
    await expect(endOwnSessions({ key }, person, sessionId)).rejects.toMatchObject({ code: "not-found" });
  });

  it("all end but this one, and nobody else's", async () => {
    const { person, sessionId, other } = await signedInTwice();
    const idris = await insertPerson(["planner"], { name: "Idris", email: "idris@saltmarsh.example" });
    const theirs = await startSession(idris, null);
    const { sessions } = await getAccount((await bySession(theirs)) as CurrentPerson, theirs);
    await expect(endOwnSessions({ key: sessions[0].key }, person, sessionId)).rejects.toMatchObject({
      code: "not-found",
    });
    await endOwnSessions("others", person, sessionId);
    expect(
      await Promise.all([sessionId, other, theirs].map(async (id) => (await bySession(id)) !== null)),
    ).toEqual([true, false, true]);
  });
});

describe("one's own tokens", () => {
  it("do what one of one's roles may, and nothing once withdrawn", async () => {
    const { person, sessionId } = await signedInTwice();
    const token = await makeOwnToken({ name: " scales ", role: "clerk" }, person);
    expect(await byToken(token)).toMatchObject({ id: person.id, roles: ["clerk"], via: "token" });
    const { tokens } = await getAccount(person, sessionId);
    expect(tokens).toMatchObject([{ name: "scales", role: "clerk" }]);
    await withdrawOwnToken(tokens[0].id, person);
    expect(await byToken(token)).toBeNull();
    await expect(withdrawOwnToken(tokens[0].id, person)).rejects.toMatchObject({ code: "not-found" });
  });

  it("never have a role that their person has not", async () => {
    const { person } = await signedInTwice();
    for (const role of ["manager", "planner"])
      await expect(makeOwnToken({ name: "x", role }, person)).rejects.toMatchObject({
        errors: [{ field: "role" }],
      });
    await expect(makeOwnToken({ name: "", role: "clerk" }, person)).rejects.toMatchObject({
      errors: [{ field: "name" }],
    });
    expect(await database.query("SELECT 1 FROM api_token")).toEqual([]);
  });

  it("are dead once their person is kept out", async () => {
    const { person, personId } = await signedInTwice();
    const token = await makeOwnToken({ name: "x", role: "builder" }, person);
    const greta = await insertPerson(["manager"], { name: "Greta", email: "greta@saltmarsh.example" });
    const manager: CurrentPerson = {
      id: greta,
      name: "Greta",
      email: null,
      roles: ["manager"],
      via: "session",
    };
    await disablePerson(personId, manager);
    expect(await byToken(token)).toBeNull();
  });

  it("cannot make others, nor end sessions", async () => {
    const { person, sessionId } = await signedInTwice();
    const asked = (await byToken(await makeOwnToken({ name: "x", role: "clerk" }, person))) as CurrentPerson;
    await expect(makeOwnToken({ name: "y", role: "clerk" }, asked)).rejects.toMatchObject({
      code: "forbidden",
    });
    await expect(endOwnSessions("others", asked, sessionId)).rejects.toMatchObject({ code: "forbidden" });
  });
});
