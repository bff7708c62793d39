import { beforeEach, describe, expect, it } from "vitest";
import { readAuditSearch } from "~/schemas/people/audit-search";
import { exportAudit } from "~/services/audit/export-audit.server";
import { findAuditActs } from "~/services/audit/find-audit-acts.server";
import { findAuditEvents } from "~/services/audit/find-audit-events.server";
import { useTestDatabase } from "../../support/database";
import { insertPerson } from "../../support/people/insert-person";

const database = useTestDatabase();

let greta: number;
beforeEach(async () => {
  greta = await insertPerson(["manager"], { name: "Greta Lindqvist", email: "greta@saltmarsh.example" });
});

const add = (at: string, actor: number | null, act: string, subject: string, after: unknown = null) =>
  database.query(
    "INSERT INTO audit_event (at, actor_id, act, subject, `before`, `after`) VALUES (?,?,?,?,?,?)",
    [at, actor, act, subject, null, after === null ? null : JSON.stringify(after)],
  );

async function fill(): Promise<void> {
  await add("2026-11-01 10:00:00", greta, "people", "person 7", { roles: ["clerk"] });
  await add("2026-11-02 23:59:59", null, "stock", "part HB_2041", { note: "100% checked" });
  await add("2026-11-03 00:00:00", greta, "stock", "part HB-2041", { note: "1000 checked" });
}

const subjects = async (search: string) =>
  (await findAuditEvents(readAuditSearch(new URLSearchParams(search)))).events.map(({ subject }) => subject);

describe("the audit", () => {
  it("shows all, newest first, with who and what", async () => {
    await fill();
    const { events, next } = await findAuditEvents({});
    expect(events.map(({ who, act }) => [who, act])).toEqual([
      ["Greta Lindqvist", "stock"],
      [null, "stock"],
      ["Greta Lindqvist", "people"],
    ]);
    expect(events[2]).toMatchObject({ at: "2026-11-01T10:00:00.000Z", before: null });
    expect(JSON.parse(events[2].after ?? "")).toEqual({ roles: ["clerk"] });
    expect(next).toBeNull();
    expect(await findAuditActs()).toEqual(["people", "stock"]);
  });

  it.each([
    ["who=lindq", ["part HB-2041", "person 7"]],
    ["act=people", ["person 7"]],
    ["subject=hb_2", ["part HB_2041"]],
    ["text=100%25", ["part HB_2041"]],
    ["text=CLERK", ["person 7"]],
    ["from=2026-11-02&to=2026-11-02", ["part HB_2041"]],
    ["from=someday&who=&act=", ["part HB-2041", "part HB_2041", "person 7"]],
    ["who=nobody", []],
    ["who=' OR 1=1 -- ", []],
  ])("finds by %s", async (search, found) => {
    await fill();
    expect(await subjects(search)).toEqual(found);
  });

  it("goes on where a page ends, whatever is added meanwhile", async () => {
    for (let number = 0; number < 7; number++) await add("2026-11-01", greta, "stock", `part ${number}`);
    const first = await findAuditEvents({}, { size: 3 });
    await add("2026-11-01", greta, "stock", "part later");
    const second = await findAuditEvents({}, { size: 3, below: first.next });
    const third = await findAuditEvents({}, { size: 3, below: second.next });
    const seen = [first, second, third].flatMap(({ events }) => events.map(({ subject }) => subject));
    expect(seen).toEqual([6, 5, 4, 3, 2, 1, 0].map((number) => `part ${number}`));
    expect(third.next).toBeNull();
  });

  it("leaves as CSV, whole, with nothing a spreadsheet would run", async () => {
    await fill();
    await add("2026-11-04", greta, "stock", "=HYPERLINK(1)");
    let file = "";
    for await (const piece of exportAudit({ who: "greta" })) file += piece;
    const lines = file.trimEnd().split("\r\n");
    expect(lines[0]).toBe("number,at,who,act,subject,before,after");
    expect(lines).toHaveLength(4);
    expect(lines[1]).toContain("'=HYPERLINK(1)");
    expect(lines[3]).toContain("2026-11-01T10:00:00.000Z,Greta Lindqvist,people,person 7");
  });
});
