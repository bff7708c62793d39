import { describe, expect, it } from "vitest";
import { endSession } from "~/services/people/end-session.server";
import { findAsker } from "~/services/people/find-asker.server";
import { hashSecret } from "~/services/people/secret.server";
import { startSession } from "~/services/people/start-session.server";
import { readSessionId, sessionCookie } from "~/utils/session-cookie";
import { useTestDatabase } from "../../support/database";
import { insertPerson } from "../../support/people/insert-person";

const database = useTestDatabase();

const pages = { tokens: false };

function withCookie(id: string): Headers {
  return new Headers({ Cookie: `theme=dark; cotterpin_session=${id}` });
}

function makeWren(): Promise<number> {
  return insertPerson(["clerk", "builder"]);
}

describe("sessions", () => {
  it("find the person with all roles, and keep only the hash of the id", async () => {
    const personId = await makeWren();
    const id = await startSession(personId, null);
    const person = await findAsker(withCookie(id), pages);
    expect(person).toMatchObject({
      id: personId,
      name: "Wren Adlington",
      email: "wren@saltmarsh.example",
      via: "session",
    });
    expect([...(person?.roles ?? [])].sort()).toEqual(["builder", "clerk"]);
    const rows = await database.query("SELECT id_hash FROM session");
    expect(rows).toEqual([{ id_hash: hashSecret(id) }]);
    expect(JSON.stringify(rows)).not.toContain(id);
  });

  it("get a new id at sign-in, and the id that the browser had counts no more", async () => {
    const personId = await makeWren();
    const planted = await startSession(personId, null);
    const id = await startSession(personId, planted);
    expect(id).not.toBe(planted);
    expect(await findAsker(withCookie(planted), pages)).toBeNull();
    expect(await findAsker(withCookie(id), pages)).not.toBeNull();
  });

  it("are gone after signing out", async () => {
    const id = await startSession(await makeWren(), null);
    await endSession(id);
    expect(await findAsker(withCookie(id), pages)).toBeNull();
    expect(await database.query("SELECT 1 FROM session")).toEqual([]);
  });

  it("are worth nothing for somebody who is disabled", async () => {
    const personId = await makeWren();
    const id = await startSession(personId, null);
    await database.query("UPDATE person SET disabled_at = NOW(3) WHERE id = ?", [personId]);
    expect(await findAsker(withCookie(id), pages)).toBeNull();
  });

  it("end after half a day without a request and after seven days in any case", async () => {
    const personId = await makeWren();
    const idle = await startSession(personId, null);
    await database.query("UPDATE session SET seen_at = NOW(3) - INTERVAL 721 MINUTE");
    expect(await findAsker(withCookie(idle), pages)).toBeNull();
    const old = await startSession(personId, idle);
    await database.query("UPDATE session SET expires_at = NOW(3) - INTERVAL 1 SECOND");
    expect(await findAsker(withCookie(old), pages)).toBeNull();
  });

  it("stay alive while they are used", async () => {
    const id = await startSession(await makeWren(), null);
    await database.query("UPDATE session SET seen_at = NOW(3) - INTERVAL 60 MINUTE");
    await findAsker(withCookie(id), pages);
    const [row] = await database.query("SELECT seen_at > NOW(3) - INTERVAL 1 MINUTE AS fresh FROM session");
    expect(Number(row.fresh)).toBe(1);
  });

  it("are told by no made-up cookie", async () => {
    for (const id of ["", "x", "' OR 1=1 -- ", "a".repeat(43), "a".repeat(5000)]) {
      expect(await findAsker(withCookie(id), pages)).toBeNull();
    }
  });
});

describe("the session cookie", () => {
  it("is hidden from scripts and other sites, and Secure behind TLS", () => {
    const id = "A".repeat(43);
    expect(sessionCookie(id, { secure: false })).toBe(
      `cotterpin_session=${id}; Path=/; Max-Age=604800; HttpOnly; SameSite=Lax`,
    );
    expect(sessionCookie(id, { secure: true })).toMatch(/; Secure$/);
    expect(readSessionId(withCookie(id))).toBe(id);
  });
});
