import { beforeEach, expect, test } from "vitest";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { getCheckAnswer } from "~/services/planning/get-check-answer.server";
import { getCheckCsv } from "~/services/planning/get-check-csv.server";
import { useTestDatabase as testDatabase } from "../../../support/database";
import { bring, manager } from "../../imports/import-support";

const database = testDatabase();

beforeEach(async () => {
  await bring("bins", "bin\nA1\n");
  await bring(
    "parts",
    "part_number,description,sourcing,lead_time_days,unit_cost,sold\nKIT,Kit,make,2,,1\nDRIVE,Drive,make,3,,\nBOLT,=Bolt,buy,10,0.25,\nLAMP,Lamp,buy,20,9.50,\n",
  );
  await bring("structure", "parent,component,quantity\nKIT,DRIVE,1\nKIT,BOLT,2\nKIT,LAMP,1\nDRIVE,BOLT,4\n");
  await bring("stock", "part_number,bin,lot,quantity\nBOLT,A1,L1,20\nBOLT,A1,L2,3\nLAMP,A1,,9\n");
  await bring("supply", "part_number,quantity,due,reference\nBOLT,30,2999-01-10,PO-1\n");
});

const ask = (ifs: string[], person = manager) =>
  getCheckAnswer(checkQuestionSchema.parse({ kit: "KIT", quantity: 5, ifs }), person);

const header: Partial<Record<ImportKindName, string>> = {
  stock: "part_number,bin,lot,state,quantity",
  supply: "part_number,quantity,due,reference",
  parts: "part_number,sourcing,lead_time_days,unit_cost",
};

test.each<[string, string, ImportKindName, string]>([
  ["more stock", "stock:BOLT:+7", "stock", "BOLT,A1,L1,usable,27"],
  ["less stock", "stock:LAMP:-6", "stock", "LAMP,A1,,usable,3"],
  ["a lot held", "hold:BOLT:L1", "stock", "BOLT,A1,L1,usable,0\nBOLT,A1,L1,held,20"],
  ["an order earlier", "order:PO-1:2999-01-02", "supply", "BOLT,30,2999-01-02,PO-1"],
  ["something that comes", "arrival:LAMP:4:2999-01-05", "supply", "LAMP,4,2999-01-05,PO-9"],
  ["a lead time", "lead:BOLT:40", "parts", "BOLT,buy,40,0.25"],
  ["a price", "cost:BOLT:1.75", "parts", "BOLT,buy,10,1.75"],
])("%s tried is as when it is done", async (_what, change, kind, rows) => {
  const tried = await ask([change]);
  expect(tried.ifs).toEqual([{ text: change, problem: null }]);
  const before = await ask([]);
  expect(tried.without).toMatchObject({ buildable: before.answer?.demand[0].buildable });
  await bring(kind, `${header[kind]}\n${rows}\n`);
  expect(tried.answer).toEqual((await ask([])).answer);
});

test("several changes of one part are tried together", async () => {
  const { answer, parts } = await ask(["lead:BOLT:40", "cost:BOLT:2", "stock:BOLT:-23"]);
  expect(answer?.demand[0].buildable).toBe(0);
  expect(parts.find(({ partNumber }) => partNumber === "BOLT")).toMatchObject({
    leadTimeDays: 40,
    unitCost: "2",
  });
});

test("one that cannot be tried says why, and the others are tried", async () => {
  const { ifs, answer } = await ask([
    "stock:NUT:+1",
    "nonsense",
    "stock:BOLT:lots",
    "stock:BOLT:+7",
    "stock:BOLT:-99",
  ]);
  expect(ifs.map(({ problem }) => problem)).toEqual([
    "There is no part NUT in the book.",
    expect.stringContaining("no change that can be tried"),
    expect.stringContaining("a quantity with its sign"),
    null,
    expect.stringContaining("There are only"),
  ]);
  expect(answer?.demand[0].buildable).toBe(5);
});

test("prices are tried only for people who may see them", async () => {
  const builder = { ...manager, roles: ["builder" as const] };
  const { ifs, without } = await ask(["cost:BOLT:99", "stock:BOLT:+7"], builder);
  expect(ifs.map(({ problem }) => problem)).toEqual([expect.stringContaining("Prices"), null]);
  expect(without?.cost).toBeNull();
  expect(JSON.stringify(await ask(["stock:BOLT:+7"], builder))).not.toMatch(/"(unitCost|cost)":"/);
});

test("nothing of it is stored", async () => {
  const tables = ["balance", "movement", "purchase_order_line", "part", "setting", "audit_event", "revision"];
  const read = () => Promise.all(tables.map((table) => database.query(`SELECT * FROM ${table}`)));
  const before = await read();
  await ask([
    "stock:BOLT:+7",
    "hold:BOLT:L2",
    "order:PO-1:2999-01-02",
    "arrival:LAMP:4:2999-01-05",
    "lead:BOLT:4",
  ]);
  expect(await read()).toEqual(before);
});

test("as a file the parts that are missing stand with their figures, harmless in a spreadsheet", async () => {
  const asked = checkQuestionSchema.parse({ kit: "KIT", quantity: 5, ifs: ["stock:BOLT:-3"] });
  const lines = (await getCheckCsv(asked, manager)).split("\r\n");
  expect(lines[0]).toContain("kits,part_number,description,");
  expect(lines[1]).toContain("5 KIT,BOLT,'=Bolt,,EA,30,20,10,0,10,4,");
  expect(await getCheckCsv(asked, { ...manager, roles: ["clerk"] })).not.toContain("cost");
});

test("the file names what was tried and what could not be", async () => {
  const asked = checkQuestionSchema.parse({ kit: "KIT", quantity: 5, ifs: ["stock:BOLT:-3", "=nonsense"] });
  const [header, row] = (await getCheckCsv(asked, { ...manager, roles: ["clerk"] })).split("\r\n");
  expect(header).toMatch(/,what_if,not_tried$/);
  expect(row).toMatch(/,stock:BOLT:-3,'=nonsense$/);
});
