import { beforeEach, expect, test } from "vitest";
import { shipCheckQuerySchema } from "~/schemas/planning/ship-check";
import { getStructurePlan } from "~/services/parts/get-structure-plan.server";
import { getShipCheck } from "~/services/planning/get-ship-check.server";
import { useTestDatabase as testDatabase } from "../../support/database";
import { addStepsOf } from "../../support/planning/add-steps-of";
import { bring, manager, refusal } from "../imports/import-support";

testDatabase();

beforeEach(async () => {
  await bring("bins", "bin\nA1\n");
  await bring(
    "parts",
    "part_number,description,sourcing,decimals,yield,sold\nKIT,Kit,make,0,,1\nDRIVE,Drive,make,0,0.8,\nBOX,Box,phantom,0,,\nBOLT,Bolt,buy,0,,\nTAPE,Tape,buy,3,,\nGREASE,Grease,buy,3,,\n",
  );
  await bring(
    "structure",
    "parent,component,quantity,scrap,option\nKIT,DRIVE,1,,\nKIT,BOLT,2,,\nKIT,BOX,1,,\nKIT,TAPE,0.1,,LONG\nDRIVE,BOLT,4,0.1,\nDRIVE,GREASE,,,\nBOX,BOLT,3,,\nBOX,TAPE,0.350,,\n",
  );
  await bring("stock", "part_number,bin,quantity\nBOLT,A1,23\nDRIVE,A1,1\nTAPE,A1,1\n");
});

const plan = (kits: number, options: string[] = []) => getStructurePlan("KIT", { kits, options });

test("the tree goes depth first, and what its lines ask for adds up to what each part needs", async () => {
  const { rows, parts } = await plan(5, ["LONG"]);
  const names = rows.map(({ level, part }) => `${level} ${parts[part].partNumber}`);
  expect(names).toEqual([
    "1 KIT",
    "2 DRIVE",
    "3 BOLT",
    "3 GREASE",
    "2 BOLT",
    "2 BOX",
    "3 BOLT",
    "3 TAPE",
    "2 TAPE",
  ]);
  for (const [index, part] of parts.entries()) {
    const needs = rows.filter((row) => row.part === index).flatMap(({ need }) => need ?? []);
    const asked = part.partNumber === "KIT" ? 5_000_000n : 0n;
    expect(addStepsOf(needs) + asked, part.partNumber).toBe(addStepsOf([part.needed]));
  }
  expect(parts.find(({ partNumber }) => partNumber === "DRIVE")).toMatchObject({
    needed: "5",
    fromStock: "1",
    built: "5",
    missing: null,
  });
  expect(parts.find(({ partNumber }) => partNumber === "BOLT")).toMatchObject({
    fromStock: "23",
    missing: "25",
    places: 3,
  });
  expect(rows[3]).toMatchObject({ isAsRequired: true, need: null });
});

test("what is missing is what the ship check says", async () => {
  const { parts } = await plan(5);
  const query = shipCheckQuerySchema.parse({ kit: "KIT", quantity: "5" });
  const { shortages } = await getShipCheck(query, manager);
  const missing = parts.flatMap(({ partNumber, missing }) =>
    missing && Number(missing) > 0 ? [[partNumber, missing]] : [],
  );
  expect(missing).toEqual(shortages.map(({ partNumber, missing }) => [partNumber, missing]));
});

test("a line whose option is not chosen asks for nothing", async () => {
  const { rows } = await plan(5);
  expect(rows.at(-1)).toMatchObject({ option: "LONG", need: null });
});

test("a ladder of sixty diamonds has each part's own parts once", async () => {
  const names = Array.from({ length: 61 }, (_, level) => `L${level}`);
  const sides = names.slice(0, 60).flatMap((name) => [`${name}A`, `${name}B`]);
  await bring(
    "parts",
    `part_number,sourcing\n${[...names, ...sides].map((name) => `${name},make`).join("\n")}\n`,
  );
  const lines = names
    .slice(0, 60)
    .flatMap((name, level) => [
      `${name},${name}A,1`,
      `${name},${name}B,1`,
      `${name}A,L${level + 1},1`,
      `${name}B,L${level + 1},1`,
    ]);
  await bring("structure", `parent,component,quantity\n${lines.join("\n")}\n`);
  const { rows, parts } = await getStructurePlan("L0", { kits: 1, options: [] });
  expect(parts).toHaveLength(181);
  expect(rows.length).toBeLessThan(400);
  expect(rows.some(({ at }) => at !== null)).toBe(true);
});

test("what is not there is said", async () => {
  expect((await refusal(getStructurePlan("NUT", { kits: 1, options: [] }))).code).toBe("not-found");
  expect((await refusal(plan(1, ["RED"]))).message).toContain("has no option RED");
});
