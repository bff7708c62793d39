import { beforeAll, describe, expect, it, vi } from "vitest";
import type { Role } from "~/schemas/people/role";
import { getHeaders } from "~/services/imports/get-headers.server";
import { createToken } from "~/services/people/create-token.server";
import { useTestDatabase } from "../support/database";
import { makeBuild, OURS, readRoutes, startApplication } from "./application";

const database = useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

let application: Awaited<ReturnType<typeof startApplication>>;

beforeAll(async () => {
  const build = await makeBuild(await readRoutes());
  built.routes = build.routes;
  application = await startApplication(build);
});

async function send(path: string, body: string, { role = "manager" as Role, type = "text/csv" } = {}) {
  const headers = {
    ...OURS,
    Authorization: `Bearer ${await createToken({ role, name: "import" })}`,
    "Content-Type": type,
  };
  const response = await application(`/api/imports/${path}`, { method: "POST", body, headers });
  return { status: response.status, type: response.headers.get("Content-Type"), body: await response.json() };
}

const parts = "part_number,sourcing\nKIT,make\nBOLT,buy\n";

describe("POST /api/imports/:kind", () => {
  it("says line by line what would change, then does it, then changes nothing", async () => {
    const tried = await send("parts?dryRun=1", parts);
    expect(tried).toMatchObject({
      status: 200,
      body: {
        rows: [
          { line: 2, result: "new", before: null, after: { partNumber: "KIT" }, errors: [] },
          { line: 3, result: "new", before: null, after: { partNumber: "BOLT" }, errors: [] },
        ],
        counts: { new: 2, changed: 0, same: 0, refused: 0 },
      },
    });
    expect(await database.query("SELECT id FROM part")).toEqual([]);
    expect((await send("parts", parts)).status).toBe(200);
    expect((await send("parts", parts)).body.counts).toMatchObject({ new: 0, same: 2 });
  });

  it("answers 422 with line, column and value of each error, and keeps nothing", async () => {
    const answer = await send("parts", `${parts}NUT,stolen\n`);
    expect(answer).toMatchObject({
      status: 422,
      type: expect.stringContaining("application/problem+json"),
      body: { status: 422, errors: [{ line: 4, column: "sourcing", value: "stolen" }] },
    });
    expect(await database.query("SELECT id FROM part")).toEqual([]);
    expect((await send("parts?dryRun=1", `${parts}NUT,stolen\n`)).body.counts).toMatchObject({
      new: 2,
      refused: 1,
    });
  });

  it("matches headers by hand, leaves columns out, and remembers it once the file is in", async () => {
    const theirs = "Part no.,sourcing,Shelf\nKIT,make,9\n";
    const refused = await send("parts?dryRun=1", theirs);
    expect(
      refused.body.errors.filter((error: { unknownHeader?: true }) => error.unknownHeader),
    ).toMatchObject([{ value: "Part no." }, { value: "Shelf" }]);
    const headers = encodeURIComponent(JSON.stringify({ "Part no.": "part_number", Shelf: "" }));
    expect((await send(`parts?dryRun=1&headers=${headers}`, theirs)).body.counts).toMatchObject({ new: 1 });
    expect(await getHeaders("parts")).toEqual({});
    expect((await send(`parts?headers=${headers}`, theirs)).status).toBe(200);
    expect(await getHeaders("parts")).toEqual({ "Part no.": "part_number", Shelf: "" });
    expect((await send("parts?headers=nonsense", theirs)).status).toBe(422);
  });

  it("posts movements with their reversals, tries them without a trace, and posts nothing twice", async () => {
    await send("parts", "part_number,sourcing\nBOLT,buy\n");
    await send("bins", "bin\nA1\n");
    const movements =
      "number,reverses,happened_at,kind,part_number,quantity,from_bin,to_bin,reason\n1,,2026-11-01T08:00:00Z,receive,BOLT,9,,A1,\n2,1,2026-11-01T08:00:00Z,reverse,BOLT,9,,,Wrong part\n3,,2026-11-02T08:00:00Z,receive,BOLT,4,,A1,\n";
    const onHand = () => database.query("SELECT quantity FROM balance WHERE quantity <> 0");
    expect((await send("movements?dryRun=1", movements)).body.counts).toMatchObject({ new: 3, refused: 0 });
    expect(await onHand()).toEqual([]);
    expect((await send("movements", movements)).body.counts).toMatchObject({ new: 3 });
    expect((await send("movements", movements)).body.counts).toMatchObject({ new: 0, same: 3 });
    expect(await onHand()).toEqual([{ quantity: "4.000000" }]);
    const short = movements.replace("receive,BOLT,4,,A1,", "issue,BOLT,40,A1,,");
    expect((await send("movements?dryRun=1", short)).body.rows[2]).toMatchObject({
      line: 4,
      result: "refused",
    });
  });

  it("asks for the right of the kind", async () => {
    expect((await send("parts", parts, { role: "planner" })).status).toBe(200);
    expect((await send("parts", parts, { role: "builder" })).status).toBe(403);
    expect((await send("stock?dryRun=1", "part_number,quantity\nBOLT,1\n", { role: "planner" })).status).toBe(
      403,
    );
    const response = await application("/api/imports/parts", {
      method: "POST",
      body: parts,
      headers: { ...OURS, "Content-Type": "text/csv" },
    });
    expect(response.status).toBe(401);
  });

  it("takes text/csv only, and kinds that there are", async () => {
    expect((await send("parts", "{}", { type: "application/json" })).status).toBe(415);
    expect((await send("secrets", parts)).status).toBe(404);
    expect((await send("constructor", parts)).status).toBe(404);
    expect((await send("parts?dryRun=maybe", parts)).status).toBe(400);
  });
});
