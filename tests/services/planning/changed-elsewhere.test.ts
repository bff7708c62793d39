import { beforeEach, expect, test } from "vitest";
import { getPlanBook } from "~/services/planning/get-plan-book.server";
import { getShipCheck } from "~/services/planning/get-ship-check.server";
import { runCommand } from "../../../scripts/bootstrap/run-command.mjs";
import { useTestDatabase as testDatabase } from "../../support/database";
import { bring, manager } from "../imports/import-support";

testDatabase();

/** The same import in another process, which keeps a book of its own. */
async function bringElsewhere(kind: string, text: string): Promise<void> {
  const words = ["--import", "tsx", "tests/services/planning/bring-elsewhere.ts", kind, text];
  const { code, output } = await runCommand(process.execPath, words, { output: "quiet" });
  expect(code, output).toBe(0);
}

async function buildable() {
  const answer = await getShipCheck({ kit: "KIT", quantity: "10", options: [] }, manager);
  return answer.buildable.KIT;
}

beforeEach(async () => {
  await bring("bins", "bin,zone,walk_order,description\nA1,Store,1,Shelf\n");
  await bring("parts", "part_number,sourcing,unit,decimals\nKIT,make,EA,0\nBOLT,buy,EA,0\n");
  await bring("structure", "parent,component,quantity\nKIT,BOLT,2\n");
  await bring("stock", "part_number,bin,lot,state,quantity\nBOLT,A1,,usable,8\n");
});

test("the book is kept while nothing changes", async () => {
  expect(await buildable()).toBe(4);
  expect(await getPlanBook()).toBe(await getPlanBook());
});

test("stock that another process changes is in the next answer", async () => {
  expect(await buildable()).toBe(4);
  const before = await getPlanBook();
  await bringElsewhere("stock", "part_number,bin,lot,state,quantity\nBOLT,A1,,usable,14\n");
  expect(await buildable()).toBe(7);
  expect((await getPlanBook()).structure).toBe(before.structure);
}, 60_000);

test("a structure that another process changes is in the next answer", async () => {
  expect(await buildable()).toBe(4);
  await bringElsewhere("structure", "parent,component,quantity\nKIT,BOLT,8\n");
  expect(await buildable()).toBe(1);
}, 60_000);

test("an open order that another process brings is in the next answer", async () => {
  const before = (await getPlanBook()).rows.orders;
  expect(before).toEqual([]);
  await bringElsewhere("supply", "part_number,quantity,due,reference\nBOLT,6,2027-01-11,PO-1\n");
  expect((await getPlanBook()).rows.orders).toMatchObject([{ partNumber: "BOLT", quantity: "6" }]);
}, 60_000);
