import { describe, expect, it } from "vitest";
import type { Role } from "~/schemas/people/role";
import { createPerson } from "~/services/people/create-person.server";
import { useTestDatabase } from "../../support/database";

const database = useTestDatabase();

const maud = {
  name: "Maud Okonjo",
  email: "maud@saltmarsh.example",
  password: "a sentence of maud's",
  roles: ["purchaser"] as Role[],
};

describe("createPerson", () => {
  it("keeps the person, the roles and an audit event without the password", async () => {
    const id = await createPerson(maud, { actorId: null });
    const [person] = await database.query("SELECT name, email, password_hash FROM person WHERE id = ?", [id]);
    expect(person).toMatchObject({ name: maud.name, email: maud.email });
    expect(person.password_hash).toMatch(/^\$2[aby]\$11\$/);
    const [event] = await database.query("SELECT act, subject, `after` FROM audit_event");
    expect(event).toMatchObject({ act: "people", subject: `person ${id}` });
    expect(JSON.stringify(event)).not.toContain("$2");
    expect(JSON.stringify(event)).not.toContain(maud.password);
  });

  it("says so when the address is in use, however it is written", async () => {
    await createPerson(maud);
    await expect(createPerson({ ...maud, email: " MAUD@saltmarsh.example" })).rejects.toMatchObject({
      code: "conflict",
      errors: [{ field: "email", message: "Somebody with this e-mail address is here already." }],
    });
    expect(await database.query("SELECT id FROM person")).toHaveLength(1);
  });

  it.each([
    ["eleven char", /at least 12/],
    ["é, ü and ö ".repeat(8), /at most 72/],
    ["Password 1234", /first that are tried/],
    ["aaaaaaaaaaaaaaaa", /first that are tried/],
    ["1212121212121212", /first that are tried/],
  ])("refuses the password %s", async (password, sentence) => {
    await expect(createPerson({ ...maud, password })).rejects.toMatchObject({
      code: "invalid",
      errors: [{ field: "password", message: expect.stringMatching(sentence) }],
    });
  });

  it("takes passwords of 12 and of 72 bytes", async () => {
    await createPerson({ ...maud, password: "twelve bytes" });
    await createPerson({
      ...maud,
      email: "other@saltmarsh.example",
      password: "long ".repeat(14).padEnd(72, "x"),
    });
  });

  it("refuses people without name, address or role", async () => {
    await expect(createPerson({ ...maud, name: "  ", email: "maud", roles: [] })).rejects.toMatchObject({
      errors: [{ field: "name" }, { field: "email" }, { field: "roles" }],
    });
  });
});
