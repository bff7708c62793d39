import { describe, expect, it } from "vitest";
import { getSignInPage } from "~/services/people/get-sign-in-page.server";
import { makeSetupCode } from "~/services/people/make-setup-code.server";
import { setUpManager } from "~/services/people/set-up-manager.server";
import { useTestDatabase } from "../../support/database";

const database = useTestDatabase();

const form = { name: "Greta Lindqvist", email: "greta@saltmarsh.example", password: "a sentence of greta's" };

async function makeCode(): Promise<string> {
  const code = await makeSetupCode();
  if (code === null) throw new Error("No code was made.");
  return code;
}

describe("setting up the first manager", () => {
  it("takes the code once, however it is typed", async () => {
    const code = await makeCode();
    expect(code).toMatch(/^([A-Z2-9]{4}-){3}[A-Z2-9]{4}$/);
    expect((await getSignInPage()).needsSetUp).toBe(true);
    const id = await setUpManager({ ...form, code: code.toLowerCase().replaceAll("-", " ") }, "here");
    expect(await database.query("SELECT role FROM person_role WHERE person_id = ?", [id])).toEqual([
      { role: "manager" },
    ]);
    await expect(setUpManager({ ...form, email: "x@y.example", code }, "here")).rejects.toMatchObject({
      code: "conflict",
    });
    expect((await getSignInPage()).needsSetUp).toBe(false);
  });

  it("is worth nothing a second time even without a manager", async () => {
    const code = await makeCode();
    await setUpManager({ ...form, code }, "here");
    await database.query("DELETE FROM person_role");
    await expect(setUpManager({ ...form, email: "x@y.example", code }, "here")).rejects.toMatchObject({
      code: "invalid",
      errors: [{ field: "code" }],
    });
  });

  it("makes one manager when two use the code at once", async () => {
    const code = await makeCode();
    const both = await Promise.allSettled(
      ["one@y.example", "two@y.example"].map((email) => setUpManager({ ...form, email, code }, "here")),
    );
    expect(both.filter(({ status }) => status === "fulfilled")).toHaveLength(1);
    expect(await database.query("SELECT id FROM person")).toHaveLength(1);
  });

  it("keeps the code when the form has a fault", async () => {
    const code = await makeCode();
    await expect(setUpManager({ ...form, password: "short", code }, "here")).rejects.toMatchObject({
      errors: [{ field: "password" }],
    });
    await setUpManager({ ...form, code }, "here");
  });

  it("counts the code only of the last start, and not for ever", async () => {
    const old = await makeCode();
    const code = await makeCode();
    await expect(setUpManager({ ...form, code: old }, "here")).rejects.toMatchObject({
      errors: [{ field: "code" }],
    });
    await database.query("UPDATE setup_code SET expires_at = NOW(3) - INTERVAL 1 SECOND");
    await expect(setUpManager({ ...form, code }, "here")).rejects.toMatchObject({
      errors: [{ field: "code" }],
    });
  });

  it("makes no code once there is a manager, and keeps only hashes", async () => {
    const code = await makeCode();
    const rows = JSON.stringify(await database.query("SELECT * FROM setup_code"));
    expect(rows).not.toContain(code.slice(0, 4));
    await setUpManager({ ...form, code }, "here");
    expect(await makeSetupCode()).toBeNull();
  });

  it("refuses after ten wrong codes", async () => {
    const code = await makeCode();
    for (let n = 0; n < 10; n++) {
      await expect(setUpManager({ ...form, code: `wrong ${n}` }, "here")).rejects.toMatchObject({
        code: "invalid",
      });
    }
    await expect(setUpManager({ ...form, code }, "here")).rejects.toMatchObject({ code: "too-many" });
  });
});

describe("the sign-in page", () => {
  it("offers the five people in the demo alone", async () => {
    expect((await getSignInPage()).demo).toEqual([]);
    await database.query("INSERT INTO setting (name, value) VALUES ('demo', 'true')");
    const { demo, needsSetUp } = await getSignInPage();
    expect(demo.map(({ role }) => role).sort()).toEqual([
      "builder",
      "clerk",
      "manager",
      "planner",
      "purchaser",
    ]);
    expect(needsSetUp).toBe(false);
  });
});
