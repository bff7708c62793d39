import { Secret, TOTP } from "otpauth";
import { describe, expect, it } from "vitest";
import type { CurrentPerson } from "~/services/people/current-person";
import { findAsker } from "~/services/people/find-asker.server";
import { beginSecondFactor } from "~/services/people/second-factor/begin-second-factor.server";
import { beginSignIn } from "~/services/people/second-factor/begin-sign-in.server";
import { confirmSecondFactor } from "~/services/people/second-factor/confirm-second-factor.server";
import { endSecondFactor } from "~/services/people/second-factor/end-second-factor.server";
import { finishSignIn } from "~/services/people/second-factor/finish-sign-in.server";
import { getSecondFactor } from "~/services/people/second-factor/get-second-factor.server";
import { resetSecondFactor } from "~/services/people/second-factor/reset-second-factor.server";
import { openSecret, sealSecret } from "~/services/people/second-factor/seal-secret.server";
import { spendCode } from "~/services/people/second-factor/spend-code.server";
import { startSession } from "~/services/people/start-session.server";
import { useTestDatabase } from "../../../support/database";
import { insertPerson, PASSWORD } from "../../../support/people/insert-person";

const database = useTestDatabase();

const address = "192.0.2.7";

function asPerson(id: number, roles: CurrentPerson["roles"] = ["clerk"]): CurrentPerson {
  return { id, name: "Wren Adlington", email: "wren@saltmarsh.example", roles, via: "session" };
}

/** The code some steps from now, as the authenticator shows it. */
function codeOf(secret: string, steps = 0): string {
  const totp = new TOTP({ secret: Secret.fromBase32(secret.replaceAll(" ", "")) });
  return totp.generate({ timestamp: Date.now() + steps * 30_000 });
}

/** Wren with a second factor; its set-up took the code of one step ago. */
async function withSecondFactor() {
  const personId = await insertPerson(["clerk"]);
  const person = asPerson(personId);
  await beginSecondFactor(person);
  const secret = (await getSecondFactor(person)).setUp?.secret ?? "";
  const codes = await confirmSecondFactor(codeOf(secret, -1), person, address);
  const use = (code: string) => spendCode({ personId, code, address });
  return { personId, person, secret, codes, use };
}

describe("setting up", () => {
  it("is off until a code confirms it, then never shows the secret again", async () => {
    const person = asPerson(await insertPerson(["clerk"]));
    expect(await getSecondFactor(person)).toMatchObject({ state: "off", setUp: null });
    await beginSecondFactor(person);
    const { state, setUp } = await getSecondFactor(person);
    expect(state).toBe("begun");
    expect(setUp?.secret).toMatch(/^([A-Z2-7]{4} ){7}[A-Z2-7]{4}$/);
    expect(Buffer.from(setUp?.picture.split(",")[1] ?? "", "base64").toString()).toMatch(/^<svg /);
    expect(await beginSignIn(person.id as number)).toBeNull();
    await expect(confirmSecondFactor("000000x", person, address)).rejects.toMatchObject({
      errors: [{ field: "code" }],
    });
    expect((await getSecondFactor(person)).state).toBe("begun");
    await confirmSecondFactor(codeOf(setUp?.secret ?? ""), person, address);
    expect(await getSecondFactor(person)).toEqual({ state: "on", setUp: null, recoveryCodesLeft: 10 });
    await expect(beginSecondFactor(person)).rejects.toMatchObject({ code: "conflict" });
  });

  it("keeps secret and recovery codes where a copy of the tables tells nothing", async () => {
    const { secret, codes, personId } = await withSecondFactor();
    const rows = JSON.stringify([
      await database.query("SELECT * FROM second_factor"),
      await database.query("SELECT * FROM recovery_code"),
      await database.query("SELECT * FROM audit_event"),
    ]);
    expect(rows).not.toContain(secret.replaceAll(" ", ""));
    for (const code of codes) expect(rows).not.toContain(code);
    const sealed = sealSecret(personId, "JBSWY3DP");
    expect(openSecret(personId, sealed)).toBe("JBSWY3DP");
    expect(() => openSecret(personId + 1, sealed)).toThrow();
    expect(() => openSecret(personId, `${sealed.slice(0, -2)}AA`)).toThrow();
  });
});

describe("a code", () => {
  it("counts once, and none before it afterwards", async () => {
    const { secret, use } = await withSecondFactor();
    await expect(use(codeOf(secret, -1))).rejects.toMatchObject({ code: "invalid" });
    await use(codeOf(secret, 1));
    for (const steps of [1, 0, -1])
      await expect(use(codeOf(secret, steps))).rejects.toMatchObject({ code: "invalid" });
  });

  it("lets one of several in that show it at once", async () => {
    const { secret, use } = await withSecondFactor();
    const code = codeOf(secret, 1);
    const shown = await Promise.allSettled(Array.from({ length: 5 }, () => use(code)));
    expect(shown.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
  });

  it("may be a recovery code, each once, however it is typed", async () => {
    const { codes, person, use } = await withSecondFactor();
    expect(new Set(codes).size).toBe(10);
    await use(codes[0].toLowerCase().replaceAll("-", " "));
    await expect(use(codes[0])).rejects.toMatchObject({ code: "invalid" });
    await use(codes[9]);
    expect((await getSecondFactor(person)).recoveryCodesLeft).toBe(8);
  });

  it("is tried as often as a password and no more", async () => {
    const { secret, use } = await withSecondFactor();
    for (let n = 0; n < 10; n++) await expect(use("not it")).rejects.toMatchObject({ code: "invalid" });
    await expect(use(codeOf(secret, 1))).rejects.toMatchObject({ code: "too-many" });
  });
});

describe("signing in with it", () => {
  const half = (id: string) => new Headers({ Cookie: `cotterpin_half=${id}` });
  const asker = (id: string) =>
    findAsker(new Headers({ Cookie: `cotterpin_session=${id}` }), { tokens: false });

  it("takes password and code, and the half way counts once and for nothing else", async () => {
    const { personId, secret } = await withSecondFactor();
    const id = (await beginSignIn(personId)) ?? "";
    expect(await asker(id)).toBeNull();
    await expect(finishSignIn(half(id), { code: "000" })).rejects.toMatchObject({ code: "invalid" });
    const sessionId = await finishSignIn(half(id), { code: codeOf(secret, 1) });
    expect(await asker(sessionId)).toMatchObject({ id: personId });
    await expect(finishSignIn(half(id), { code: codeOf(secret, 1) })).rejects.toMatchObject({
      code: "unauthenticated",
    });
  });

  it("asks for the password again after five minutes, and of somebody who is kept out", async () => {
    const { personId, secret } = await withSecondFactor();
    const id = (await beginSignIn(personId)) ?? "";
    await database.query("UPDATE half_sign_in SET expires_at = NOW(3) - INTERVAL 1 SECOND");
    await expect(finishSignIn(half(id), { code: codeOf(secret, 1) })).rejects.toMatchObject({
      code: "unauthenticated",
    });
    const again = (await beginSignIn(personId)) ?? "";
    await database.query("UPDATE person SET disabled_at = NOW(3)");
    await expect(finishSignIn(half(again), { code: codeOf(secret, 1) })).rejects.toMatchObject({
      code: "unauthenticated",
    });
  });
});

describe("switching it off", () => {
  it("takes password and code", async () => {
    const { person, secret } = await withSecondFactor();
    const off = (password: string, code: string) => endSecondFactor({ password, code, address }, person);
    await expect(off("wrong", codeOf(secret, 1))).rejects.toMatchObject({ code: "invalid" });
    await expect(off(PASSWORD, "000000x")).rejects.toMatchObject({ code: "invalid" });
    await off(PASSWORD, codeOf(secret, 1));
    expect(await getSecondFactor(person)).toMatchObject({ state: "off" });
    expect(await database.query("SELECT 1 FROM recovery_code")).toEqual([]);
  });

  it("is done for others by a manager, ends their sessions, and never one's own", async () => {
    const { personId, person } = await withSecondFactor();
    await startSession(personId, null);
    const greta = await insertPerson(["manager"], { name: "Greta", email: "greta@saltmarsh.example" });
    await expect(resetSecondFactor(personId, person)).rejects.toMatchObject({ code: "forbidden" });
    await resetSecondFactor(personId, asPerson(greta, ["manager"]));
    expect(await getSecondFactor(person)).toMatchObject({ state: "off" });
    expect(await database.query("SELECT 1 FROM session")).toEqual([]);
    await expect(resetSecondFactor(greta, asPerson(greta, ["manager"]))).rejects.toMatchObject({
      code: "conflict",
    });
  });
});
