import { strFromU8, unzipSync } from "fflate";
import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import type { Role } from "~/schemas/people/role";
import { createToken } from "~/services/people/create-token.server";
import { bring } from "../services/imports/import-support";
import { useTestDatabase } from "../support/database";
import { makeBuild, readRoutes, startApplication } from "./application";

useTestDatabase();

const built = vi.hoisted(() => ({ routes: {} as Record<string, unknown> }));
vi.mock("virtual:react-router/server-build", () => built);

let application: Awaited<ReturnType<typeof startApplication>>;

beforeAll(async () => {
  const build = await makeBuild(await readRoutes());
  built.routes = build.routes;
  application = await startApplication(build);
});

beforeEach(() => bring("parts", "part_number,sourcing,unit_cost\nBOLT,buy,0.25\n"));

async function ask(path: string, role?: Role) {
  const headers = role
    ? { Authorization: `Bearer ${await createToken({ role, name: "export" })}` }
    : undefined;
  return application(path, { headers });
}

describe("GET /api/exports/:kind", () => {
  it("streams a table as CSV under its name", async () => {
    const response = await ask("/api/exports/parts", "planner");
    expect(response.headers.get("Content-Type")).toBe("text/csv; charset=utf-8");
    expect(response.headers.get("Content-Disposition")).toBe('attachment; filename="parts.csv"');
    expect(await response.text()).toContain("\r\nBOLT,buy,,EA,0,0,0,lot-for-lot,,,,,1,0.25,,0\r\n");
  });

  it("says which exports there are, and who may have them", async () => {
    expect((await ask("/api/exports/parts")).status).toBe(401);
    expect((await ask("/api/exports/offers", "clerk")).status).toBe(403);
    const missing = await ask("/api/exports/nothing", "clerk");
    expect(missing.status).toBe(404);
    expect((await missing.json()).detail).toContain("suppliers, bins, parts");
  });

  it("gives the whole book to the manager alone", async () => {
    expect((await ask("/api/exports/book", "purchaser")).status).toBe(403);
    const response = await ask("/api/exports/book", "manager");
    const files = unzipSync(new Uint8Array(await response.arrayBuffer()));
    expect(strFromU8(files["parts.csv"])).toContain("BOLT");
  });
});
