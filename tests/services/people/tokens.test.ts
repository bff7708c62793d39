import { describe, expect, it } from "vitest";
import { createToken } from "~/services/people/create-token.server";
import { findAsker } from "~/services/people/find-asker.server";
import { hashSecret } from "~/services/people/secret.server";
import { startSession } from "~/services/people/start-session.server";
import { useTestDatabase } from "../../support/database";
import { insertPerson } from "../../support/people/insert-person";

const database = useTestDatabase();

const api = { tokens: true };

function bearer(token: string, more: Record<string, string> = {}): Headers {
  return new Headers({ Authorization: `Bearer ${token}`, ...more });
}

function makeTam(): Promise<number> {
  return insertPerson(["builder"]);
}

describe("tokens", () => {
  it("stand for their role, kept as hashes", async () => {
    const token = await createToken({ role: "purchaser", name: "nightly list" });
    expect(await findAsker(bearer(token), api)).toEqual({
      id: null,
      name: "nightly list",
      email: null,
      roles: ["purchaser"],
      via: "token",
    });
    const [row] = await database.query("SELECT token_hash FROM api_token");
    expect(row.token_hash).toBe(hashSecret(token));
  });

  it("count only where the address takes them, and not once revoked", async () => {
    const token = await createToken({ role: "manager", name: "x" });
    expect(await findAsker(bearer(token), { tokens: false })).toBeNull();
    await database.query("UPDATE api_token SET revoked_at = NOW(3)");
    expect(await findAsker(bearer(token), api)).toBeNull();
  });

  it("put the cookie beside them out of account", async () => {
    const id = await startSession(await makeTam(), null);
    const cookie = { Cookie: `cotterpin_session=${id}` };
    expect(await findAsker(bearer("wrong", cookie), api)).toBeNull();
    expect(await findAsker(new Headers({ Authorization: "Basic abc", ...cookie }), api)).toBeNull();
  });

  it("of a person reach no further than the person does", async () => {
    const personId = await makeTam();
    const add = (token: string, role: string | null) =>
      database.query("INSERT INTO api_token (token_hash, person_id, role, name) VALUES (?, ?, ?, 'own')", [
        hashSecret(token),
        personId,
        role,
      ]);
    await add("all", null);
    await add("same", "builder");
    await add("more", "manager");
    expect((await findAsker(bearer("all"), api))?.roles).toEqual(["builder"]);
    expect((await findAsker(bearer("same"), api))?.roles).toEqual(["builder"]);
    expect((await findAsker(bearer("more"), api))?.roles).toEqual([]);
    await database.query("UPDATE person SET disabled_at = NOW(3)");
    expect(await findAsker(bearer("all"), api)).toBeNull();
  });
});
