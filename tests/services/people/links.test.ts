import { beforeEach, describe, expect, it } from "vitest";
import { OutboxMail } from "~/db/models/system/outbox-mail";
import { changePassword } from "~/services/people/account/change-password.server";
import { checkCredentials } from "~/services/people/check-credentials.server";
import { findAsker } from "~/services/people/find-asker.server";
import { acceptInvitation } from "~/services/people/links/accept-invitation.server";
import { askNewPassword } from "~/services/people/links/ask-new-password.server";
import { findLinkOwner } from "~/services/people/links/find-link-owner.server";
import { NO_PASSWORD } from "~/services/people/links/no-password";
import { setNewPassword } from "~/services/people/links/set-new-password.server";
import { disablePerson } from "~/services/people/manage/disable-person.server";
import { invitePerson } from "~/services/people/manage/invite-person.server";
import { resendInvitation } from "~/services/people/manage/resend-invitation.server";
import { startSession } from "~/services/people/start-session.server";
import { verifyPassword } from "~/services/people/verify-password.server";
import { useTestDatabase } from "../../support/database";
import { asActor } from "../../support/people/as-actor";
import { insertPerson, PASSWORD } from "../../support/people/insert-person";

const database = useTestDatabase();

const email = "bryn@saltmarsh.example";
const NEW = "another long sentence";
const GONE = { code: "conflict", message: expect.stringContaining("does not work any more") };

let greta: number;
beforeEach(async () => {
  greta = await insertPerson(["manager"], { name: "Greta Lindqvist", email: "greta@saltmarsh.example" });
});

const invite = (roles = ["clerk"]) => invitePerson({ name: "Bryn Hale", email, roles }, asActor(greta));

/** The secret of the link in the newest mail. */
async function newestSecret(): Promise<string> {
  const mail = await OutboxMail.findOne({ order: [["id", "DESC"]], rejectOnEmpty: true });
  return /\/(?:welcome|new-password)\/([\w-]{43})\n/.exec(mail.body)?.[1] ?? "none";
}

const signIn = (password: string, address = email) =>
  checkCredentials({ email: address, password, address: "10.0.0.1" });

describe("a place without a password", () => {
  it("is opened by no password, after the same work as with any other hash", async () => {
    expect(NO_PASSWORD).toHaveLength(60);
    for (const password of ["", PASSWORD, NO_PASSWORD]) {
      expect(await verifyPassword(password, NO_PASSWORD)).toBe(false);
    }
    await invite();
    await expect(signIn(PASSWORD)).rejects.toMatchObject({ code: "invalid" });
  });
});

describe("an invitation", () => {
  it("goes to the address with a link that lets in once", async () => {
    const id = await invite();
    const [mail] = await OutboxMail.findAll();
    expect(mail).toMatchObject({ toAddress: email, state: "waiting" });
    expect(mail.body).toContain("http://127.0.0.1:3000/welcome/");
    const secret = await newestSecret();
    expect(await findLinkOwner(secret, "invitation")).toEqual({ id, name: "Bryn Hale", email });
    expect(await acceptInvitation(secret, { name: "Bryn Hale-Moor", password: NEW })).toBe(id);
    expect(await signIn(NEW)).toBe(id);
    expect(await findLinkOwner(secret, "invitation")).toBeNull();
    await expect(acceptInvitation(secret, { name: "Eve", password: PASSWORD })).rejects.toMatchObject(GONE);
    expect(await signIn(NEW)).toBe(id);
  });

  it("keeps only the hash of the link", async () => {
    await invite();
    const [{ link_hash }] = await database.query("SELECT link_hash FROM person_link");
    expect(link_hash).toMatch(/^[0-9a-f]{64}$/);
    expect(link_hash).not.toContain(await newestSecret());
  });

  it("lets one of two in who use it at the same time", async () => {
    await invite();
    const secret = await newestSecret();
    const tries = [PASSWORD, NEW, "a third long sentence"].map((password) =>
      acceptInvitation(secret, { name: "Bryn Hale", password }),
    );
    const ends = await Promise.allSettled(tries);
    expect(ends.map(({ status }) => status).sort()).toEqual(["fulfilled", "rejected", "rejected"]);
  });

  it("works for seven days and no longer", async () => {
    await invite();
    const secret = await newestSecret();
    const age = (interval: string) =>
      database.query(
        `UPDATE person_link SET expires_at = created_at + INTERVAL 7 DAY - INTERVAL ${interval}`,
      );
    const [{ days }] = await database.query(
      "SELECT TIMESTAMPDIFF(MINUTE, NOW(3), expires_at) / 1440 AS days FROM person_link",
    );
    expect(Number(days)).toBeCloseTo(7, 2);
    await age("7 DAY");
    expect(await findLinkOwner(secret, "invitation")).toBeNull();
    await expect(acceptInvitation(secret, { name: "Bryn", password: NEW })).rejects.toMatchObject(GONE);
  });

  it("is withdrawn by the next, and by keeping the person out", async () => {
    const id = await invite();
    const first = await newestSecret();
    await resendInvitation(id, asActor(greta));
    const second = await newestSecret();
    expect(second).not.toBe(first);
    await expect(acceptInvitation(first, { name: "Bryn", password: NEW })).rejects.toMatchObject(GONE);
    expect(await findLinkOwner(second, "invitation")).not.toBeNull();
    await disablePerson(id, asActor(greta));
    await expect(acceptInvitation(second, { name: "Bryn", password: NEW })).rejects.toMatchObject(GONE);
  });

  it("is refused with the field to mend, and then sends nothing", async () => {
    await expect(invite([])).rejects.toMatchObject({ code: "invalid", errors: [{ field: "roles" }] });
    await invite();
    await expect(invite()).rejects.toMatchObject({ code: "conflict", errors: [{ field: "email" }] });
    expect(await OutboxMail.count()).toBe(1);
    expect(await database.query("SELECT id FROM person_link")).toHaveLength(1);
  });

  it("stays open after a password that is too short", async () => {
    await invite();
    const secret = await newestSecret();
    await expect(acceptInvitation(secret, { name: "Bryn", password: "short" })).rejects.toMatchObject({
      code: "invalid",
      errors: [{ field: "password" }],
    });
    expect(await findLinkOwner(secret, "invitation")).not.toBeNull();
  });
});

describe("a forgotten password", () => {
  const ask = (address = email) => askNewPassword({ email: address }, "10.0.0.2");

  it("is replaced by the link in the mail, once, and every session ends", async () => {
    const id = await insertPerson(["clerk"], { name: "Bryn Hale", email });
    const session = await startSession(id, null);
    await ask(" Bryn@Saltmarsh.example ");
    const secret = await newestSecret();
    await setNewPassword(secret, { password: NEW });
    expect(await signIn(NEW)).toBe(id);
    await expect(signIn(PASSWORD)).rejects.toMatchObject({ code: "invalid" });
    const headers = new Headers({ Cookie: `cotterpin_session=${session}` });
    expect(await findAsker(headers, { tokens: false })).toBeNull();
    await expect(setNewPassword(secret, { password: PASSWORD })).rejects.toMatchObject(GONE);
  });

  it("works for an hour, and a second link takes the place of the first", async () => {
    await insertPerson(["clerk"], { email });
    await ask();
    const first = await newestSecret();
    await ask();
    const second = await newestSecret();
    await expect(setNewPassword(first, { password: NEW })).rejects.toMatchObject(GONE);
    const [{ minutes }] = await database.query(
      "SELECT TIMESTAMPDIFF(SECOND, NOW(3), expires_at) / 60 AS minutes FROM person_link WHERE withdrawn_at IS NULL",
    );
    expect(Number(minutes)).toBeGreaterThan(58);
    expect(Number(minutes)).toBeLessThanOrEqual(60);
    await database.query("UPDATE person_link SET expires_at = NOW(3) - INTERVAL 1 SECOND");
    await expect(setNewPassword(second, { password: NEW })).rejects.toMatchObject(GONE);
  });

  it("needs no link any more once the person has changed the password", async () => {
    const id = await insertPerson(["clerk"], { name: "Bryn Hale", email });
    await ask();
    const secret = await newestSecret();
    const sessionId = await startSession(id, null);
    const fields = { present: PASSWORD, password: NEW };
    await changePassword(fields, asActor(id, ["clerk"]), { sessionId, address: "10.0.0.3" });
    await expect(setNewPassword(secret, { password: PASSWORD })).rejects.toMatchObject(GONE);
  });

  it("takes a link for its own kind only", async () => {
    await insertPerson(["clerk"], { email });
    await ask();
    const secret = await newestSecret();
    await expect(acceptInvitation(secret, { name: "Bryn", password: NEW })).rejects.toMatchObject(GONE);
    expect(await findLinkOwner(secret, "password")).not.toBeNull();
  });

  it("says the same after the same time of an address that nobody has, and sends nothing", async () => {
    await insertPerson(["clerk"], { email });
    const measure = async (address: string) => {
      const begun = performance.now();
      const answer = await ask(address);
      return { answer, took: performance.now() - begun };
    };
    const known = await measure(email);
    const unknown = await measure("nobody@saltmarsh.example");
    expect(unknown.answer).toEqual(known.answer);
    expect(unknown.took).toBeGreaterThanOrEqual(499);
    expect(known.took).toBeGreaterThanOrEqual(499);
    expect(await OutboxMail.count()).toBe(1);
  });

  it("sends nothing to people who are kept out", async () => {
    const id = await insertPerson(["clerk"], { email });
    await disablePerson(id, asActor(greta));
    await ask();
    expect(await OutboxMail.count()).toBe(0);
  });

  it("is asked for ten times in a quarter of an hour, not more", async () => {
    for (let time = 0; time < 10; time++) await ask("nobody@saltmarsh.example");
    await expect(ask("nobody@saltmarsh.example")).rejects.toMatchObject({ code: "too-many" });
  });
});
