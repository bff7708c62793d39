import { expect, test } from "vitest";
import { shipCheckQuerySchema } from "~/schemas/planning/ship-check";
import { getShipCheck } from "~/services/planning/get-ship-check.server";
import { checkInvariants } from "~/services/stock/check-invariants.server";
import { today } from "~/utils/clock";
import { parseInput } from "~/utils/request-body";
import { seedDemo } from "../../../scripts/seed/seed-demo";
import { useTestDatabase as testDatabase } from "../../support/database";
import { manager } from "./import-support";

const database = testDatabase();

test("the demo firm comes in once, through the imports, as it is today", async () => {
  const said: string[] = [];
  const seeding = { folder: "data/demo", today: today(), say: (sentence: string) => said.push(sentence) };
  expect(await seedDemo(seeding)).toBe(true);
  expect(said.map((sentence) => sentence.split(":")[0])).toEqual([
    "people",
    "suppliers",
    "bins",
    "parts",
    "structure",
    "offers",
    "movements",
    "stock",
    "supply",
    "kit-orders",
  ]);
  const wrong = Object.entries(await checkInvariants()).filter(([, count]) => count !== 0);
  expect(wrong).toEqual([]);
  expect(
    await database.query("SELECT COUNT(*) AS adjusted FROM movement WHERE reason = 'Stock import'"),
  ).toEqual([{ adjusted: 0 }]);
  expect(await database.query("SELECT value FROM setting WHERE name = 'demo'")).toMatchObject([
    { value: true },
  ]);
  const query = parseInput(shipCheckQuerySchema, { kit: "S2", quantity: "10" });
  expect((await getShipCheck(query, manager)).buildable).toEqual({ S2: 7 });
  expect(await seedDemo(seeding)).toBe(false);
}, 180_000);
