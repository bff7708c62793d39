import { beforeEach, describe, expect, test } from "vitest";
import { inTransaction } from "~/db/in-transaction.server";
import { shipCheckQuerySchema } from "~/schemas/planning/ship-check";
import { readPartNames } from "~/services/imports/book/read-book-names.server";
import { getShipCheck } from "~/services/planning/get-ship-check.server";
import { postMovements } from "~/services/stock/post-movements.server";
import { parseInput } from "~/utils/request-body";
import { useTestDatabase as testDatabase } from "../../support/database";
import { bring, manager, refusal, resultsOf } from "./import-support";

const database = testDatabase();

const parts =
  "part_number,description,sourcing,decimals,sold,unit_cost\nKIT,Kit,make,0,1,\nSUB,Unit,make,0,,\nBOLT,Bolt,buy,0,,0.250\nTAPE,Tape,buy,3,,1.1\nBOX,Box of parts,phantom,0,,\n";
const structure =
  "parent,component,quantity,option\nKIT,SUB,1,\nKIT,BOX,1,\nSUB,BOLT,4,\nBOX,TAPE,0.350,\nBOX,BOLT,2,RADIO\n";
const stock =
  "part_number,bin,lot,state,quantity,expires_on\nBOLT,A1,,usable,60,\nBOLT,A1,,usable,40,\nTAPE,A2,L1,usable,10.5,2027-05-01\nTAPE,A2,L2,held,1,\n";

async function numbers(sql: string) {
  return (await database.query(sql)).map((row) => Object.values(row).map(String));
}

async function revisions() {
  const rows = await database.query("SELECT name, value FROM revision");
  return Object.fromEntries(rows.map((row) => [row.name, Number(row.value)]));
}

async function bringBook() {
  await bring("parts", parts);
  await bring("structure", structure);
}

describe("every kind", () => {
  const files: [Parameters<typeof bring>[0], string][] = [
    [
      "suppliers",
      "supplier,name,email,currency,lead_time_days\nTHORN,Thornwick,orders@thornwick.example,EUR,10\nPELL,Pellbridge,,GBP,\n",
    ],
    ["bins", "bin,zone,walk_order\nA1,Main,10\nA2,Main,20\n"],
    ["parts", parts],
    ["structure", structure],
    [
      "offers",
      "supplier,part_number,unit_price,from_quantity,preferred\nthorn,bolt,0.25,0,1\nTHORN,BOLT,0.200,100,1\nPELL,TAPE,1.1,,\n",
    ],
    ["stock", stock],
    [
      "supply",
      "part_number,quantity,due,reference\nBOLT,100,2027-01-10,PO-1\nBOLT,50,,PO-1\nSUB,2,2026-12-20,SO-1\nTAPE,5.5,2027-01-02,\n",
    ],
    [
      "kit-orders",
      "number,kit,customer,serial,wanted_on,priority,options,note\nKO-1,kit,Marsh Rangers,029,2026-12-14,10,RADIO,\nKO-2,KIT,,,,20,,\n",
    ],
  ];

  test("brings in new rows, and the same file again changes nothing", async () => {
    for (const [kind, text] of files) {
      const first = await bring(kind, text);
      expect(new Set(resultsOf(first)), kind).toEqual(new Set(["new"]));
    }
    const before = await revisions();
    const [{ events }] = await database.query("SELECT COUNT(*) AS events FROM audit_event");
    for (const [kind, text] of files) {
      const again = await bring(kind, text);
      expect(new Set(resultsOf(again)), kind).toEqual(new Set(["same"]));
      expect(again.counts.removed).toBe(0);
    }
    expect(await revisions()).toEqual(before);
    expect(await database.query("SELECT COUNT(*) AS events FROM audit_event")).toEqual([{ events }]);
  });

  test("a dry run says the same and does nothing", async () => {
    for (const [kind, text] of files) {
      const before = await revisions();
      const tried = await bring(kind, text, { dryRun: true });
      expect(await revisions(), kind).toEqual(before);
      const done = await bring(kind, text);
      expect({ ...tried, dryRun: false }, kind).toEqual(done);
    }
  });

  test("the live book answers as the files say", async () => {
    for (const [kind, text] of files) await bring(kind, text);
    const answer = await getShipCheck(
      parseInput(shipCheckQuerySchema, { kit: "KIT", quantity: "25" }),
      manager,
    );
    expect(answer.buildable).toEqual({ KIT: 25 });
  });

  test.each(files)("one bad row of %s stops all of them, with line and column", async (kind, text) => {
    for (const [other, content] of files) {
      if (other === kind) break;
      await bring(other, content);
    }
    const before = await revisions();
    const [header, row] = text.split("\n");
    const cells = row.split(",");
    const quote = "\u0007";
    const error = await refusal(bring(kind, `${text}${[quote, ...cells.slice(1)].join(",")}\n`));
    expect(error.code).toBe("invalid");
    expect(error.errors[0]).toMatchObject({ line: text.split("\n").length, column: header.split(",")[0] });
    expect(await revisions()).toEqual(before);
    expect((await bring(kind, text, { dryRun: true })).counts.same).toBe(0);
  });

  test.each(files)("%s are for those who may", async (kind, text) => {
    const error = await refusal(bring(kind, text, { person: { ...manager, roles: ["builder"] } }));
    expect(error.code).toBe("forbidden");
  });
});

describe("parts", () => {
  test("compare by key, keep columns that the file does not have, count versions", async () => {
    await bring("parts", parts);
    const answer = await bring("parts", "part_number,sourcing,unit_cost\nbolt,buy,0.3\n");
    expect(answer.rows).toMatchObject([
      {
        result: "changed",
        before: { partNumber: "BOLT", unitCost: "0.25" },
        after: { partNumber: "bolt", description: "Bolt", unitCost: "0.3" },
      },
    ]);
    expect(
      await numbers("SELECT part_number, description, unit_cost, version FROM part WHERE part_key = 'BOLT'"),
    ).toEqual([["bolt", "Bolt", "0.300000", "2"]]);
    expect(await numbers("SELECT COUNT(*) FROM part")).toEqual([["5"]]);
  });

  test("names that objects have are part numbers", async () => {
    const text = "part_number,sourcing\n__proto__,buy\nconstructor,make\n007,buy\n1E05,buy\n3-12,buy\n";
    await bring("parts", text);
    await bring("structure", "parent,component,quantity\nconstructor,__proto__,1\nconstructor,007,2\n");
    expect(resultsOf(await bring("parts", text))).toEqual(["same", "same", "same", "same", "same"]);
    const names = await inTransaction((transaction) => readPartNames(transaction));
    expect([...names.values()].map((part) => part.name).sort()).toEqual([
      "007",
      "1E05",
      "3-12",
      "__proto__",
      "constructor",
    ]);
  });

  test("a number that a spreadsheet has spoiled is pointed out, not refused", async () => {
    const answer = await bring("parts", "part_number,sourcing\n1.00E+05,buy\n12-Mar,buy\n3-12,buy\n");
    expect(answer.rows.map((row) => row.notes.length)).toEqual([1, 1, 0]);
  });

  test("the same part twice is refused by both lines", async () => {
    const error = await refusal(bring("parts", "part_number,sourcing\nA,buy\nB,buy\na,buy\n"));
    expect(error.errors).toMatchObject([{ line: 4, column: "part_number", value: "a" }]);
    expect(error.errors[0].message).toContain("line 2");
  });

  test("fewer decimals than quantities in the book have are refused", async () => {
    await bringBook();
    const error = await refusal(bring("parts", "part_number,sourcing,decimals\nTAPE,buy,1\n"));
    expect(error.errors).toMatchObject([{ line: 2, column: "decimals", value: "1" }]);
    await bring("parts", "part_number,sourcing,decimals\nTAPE,buy,2\n");
  });

  test("a sourcing under which an option may not stand is refused", async () => {
    await bringBook();
    const error = await refusal(bring("parts", "part_number,sourcing\nBOX,make\n"));
    expect(error.errors).toMatchObject([{ line: 2, column: "sourcing", value: "make" }]);
  });

  test("more digits than the book keeps are refused", async () => {
    const error = await refusal(
      bring("parts", "part_number,sourcing,safety_stock,yield\nA,make,1234567890123456,0.123456789\n"),
    );
    expect(error.errors.map((each) => each.column)).toEqual(["safety_stock", "yield"]);
  });
});

describe("structure", () => {
  test("replaces all lines of each parent that the file names, and no others", async () => {
    await bringBook();
    const answer = await bring("structure", "parent,component,quantity\nkit,BOX,2\nKIT,BOLT,1\n");
    expect(resultsOf(answer)).toEqual(["changed", "new"]);
    expect(answer.removed).toMatchObject([{ parent: "KIT", component: "SUB" }]);
    expect(
      await numbers(
        `SELECT p.part_number AS parent, c.part_number AS component, TRIM(TRAILING '.' FROM TRIM(TRAILING '0' FROM l.quantity)) AS quantity FROM structure_line l
         JOIN part p ON p.id = l.parent_id JOIN part c ON c.id = l.component_id ORDER BY p.part_number, l.position`,
      ),
    ).toEqual([
      ["BOX", "TAPE", "0.35"],
      ["BOX", "BOLT", "2"],
      ["KIT", "BOX", "2"],
      ["KIT", "BOLT", "1"],
      ["SUB", "BOLT", "4"],
    ]);
  });

  test("refuses a loop through lines that are in the book already", async () => {
    await bringBook();
    const error = await refusal(bring("structure", "parent,component,quantity\nBOLT,KIT,1\n"));
    expect(error.errors).toMatchObject([{ line: 2 }]);
    expect(error.errors[0].message).toMatch(/BOLT > KIT > .*BOLT/);
  });

  test("refuses what takes an open parent below a closed one", async () => {
    await bringBook();
    const error = await refusal(bring("structure", "parent,component,quantity\nSUB,BOX,1\n"));
    expect(error.errors).toMatchObject([{ line: 2 }]);
  });

  test("refuses unknown parts and too many decimals, each by its place", async () => {
    await bringBook();
    const error = await refusal(
      bring("structure", "parent,component,quantity\nKIT,NUT,1\nNUT,BOLT,1\nKIT,TAPE,0.1234\n"),
    );
    expect(error.errors).toMatchObject([
      { line: 2, column: "component", value: "NUT" },
      { line: 3, column: "parent", value: "NUT" },
      { line: 4, column: "quantity", value: "0.1234" },
    ]);
  });

  test("another order of the same lines is kept", async () => {
    await bringBook();
    const lines = structure.trim().split("\n");
    await bring("structure", [lines[0], lines[2], lines[1], ...lines.slice(3)].join("\n"));
    const [[first]] = await numbers(
      "SELECT c.part_number FROM structure_line l JOIN part p ON p.id = l.parent_id AND p.part_number = 'KIT' JOIN part c ON c.id = l.component_id ORDER BY l.position",
    );
    expect(first).toBe("BOX");
  });
});

describe("stock", () => {
  test("sets the named balances by adjustments, adds up rows of one balance, leaves others", async () => {
    await bringBook();
    const first = await bring("stock", stock);
    expect(first.rows[0]).toMatchObject({ before: null, after: { quantity: "100", bin: "A1" } });
    await bring("stock", "part_number,bin,quantity\nbolt,a1,70\n");
    expect(await numbers("SELECT quantity FROM balance ORDER BY quantity")).toEqual([
      ["1.000000"],
      ["10.500000"],
      ["70.000000"],
    ]);
    expect(await numbers("SELECT kind, COUNT(*) FROM movement GROUP BY kind")).toEqual([["adjust", "4"]]);
    expect(await numbers("SELECT lot_code, expires_on FROM lot WHERE lot_code = 'L1'")).toMatchObject([
      ["L1", expect.stringContaining("2027")],
    ]);
  });

  test("sets them again after they have moved on", async () => {
    await bringBook();
    await bring("stock", "part_number,bin,quantity\nBOLT,A1,100\n");
    await postMovements({
      actor: { personId: null, roles: ["manager"] },
      idempotencyKey: "an-issue-of-all",
      movements: [
        { kind: "issue", partNumber: "BOLT", quantity: "100", from: { bin: "A1", state: "usable" } },
      ],
    });
    expect(resultsOf(await bring("stock", "part_number,bin,quantity\nBOLT,A1,100\n"))).toEqual(["changed"]);
    expect(await numbers("SELECT quantity FROM balance")).toEqual([["100.000000"]]);
  });

  test("makes bins that are new and says so; stock without a bin has one too", async () => {
    await bringBook();
    const answer = await bring("stock", "part_number,bin,quantity\nBOLT,Z9,5\nBOLT,,3\n");
    expect(answer.rows[0].notes.join()).toContain("Z9");
    expect(await numbers("SELECT code FROM bin ORDER BY code")).toEqual([["STORES"], ["Z9"]]);
  });

  test("changes a lot's date where the quantity stays", async () => {
    await bringBook();
    await bring("stock", stock);
    const answer = await bring(
      "stock",
      "part_number,bin,lot,quantity,expires_on\nTAPE,A2,L1,10.5,2027-08-01\n",
    );
    expect(resultsOf(answer)).toEqual(["changed"]);
    const [row] = await database.query(
      "SELECT DATE_FORMAT(expires_on, '%Y-%m-%d') AS day FROM lot WHERE lot_code = 'L1'",
    );
    expect(row.day).toBe("2027-08-01");
  });

  test("refuses two dates for one lot", async () => {
    await bringBook();
    const text =
      "part_number,bin,lot,quantity,expires_on\nTAPE,A1,L1,1,2027-08-01\nTAPE,A2,L1,1,2027-09-01\n";
    expect((await refusal(bring("stock", text))).errors).toMatchObject([{ line: 3, column: "expires_on" }]);
  });
});

describe("supply", () => {
  const rows =
    "part_number,quantity,due,reference\nBOLT,100,2027-01-10,PO-1\nBOLT,50,,PO-1\nSUB,2,2026-12-20,SO-1\nKIT,1,,SO-1\n";

  test("makes lines of purchase orders and shop orders", async () => {
    await bringBook();
    await bring("suppliers", "supplier\nTHORN\nPELL\n");
    await bring("offers", "supplier,part_number,preferred\nTHORN,BOLT,\nPELL,BOLT,1\n");
    await bring("supply", rows);
    expect(
      await numbers(
        `SELECT o.number, s.code, o.state, l.line_number, l.quantity FROM purchase_order_line l
         JOIN purchase_order o ON o.id = l.purchase_order_id JOIN supplier s ON s.id = o.supplier_id ORDER BY l.line_number`,
      ),
    ).toEqual([
      ["PO-1", "PELL", "sent", "1", "100.000000"],
      ["PO-1", "PELL", "sent", "2", "50.000000"],
    ]);
    expect(await numbers("SELECT number, quantity, state FROM shop_order ORDER BY number")).toEqual([
      ["SO-1", "2.000000", "released"],
      ["SO-1/2", "1.000000", "released"],
    ]);
    expect(await numbers("SELECT COUNT(*) FROM shop_order_component")).toEqual([["0"]]);
  });

  test("changes the nth row of a reference and part, in whatever order the file comes", async () => {
    await bringBook();
    await bring("supply", rows);
    const answer = await bring(
      "supply",
      "part_number,quantity,due,reference\nKIT,3,,SO-1\nBOLT,100,2027-01-10,PO-1\nBOLT,60,2027-02-01,PO-1\n",
    );
    expect(resultsOf(answer)).toEqual(["changed", "same", "changed"]);
    expect(await numbers("SELECT quantity FROM purchase_order_line ORDER BY line_number")).toEqual([
      ["100.000000"],
      ["60.000000"],
    ]);
    expect(await numbers("SELECT number, quantity FROM shop_order ORDER BY number")).toEqual([
      ["SO-1", "2.000000"],
      ["SO-1/2", "3.000000"],
    ]);
  });

  test("what is received already is not asked for again", async () => {
    await bringBook();
    await bring("supply", "part_number,quantity,reference\nBOLT,100,PO-1\n");
    await database.query("UPDATE purchase_order_line SET received = 40");
    expect(resultsOf(await bring("supply", "part_number,quantity,reference\nBOLT,60,PO-1\n"))).toEqual([
      "same",
    ]);
    await bring("supply", "part_number,quantity,reference\nBOLT,70,PO-1\n");
    expect(await numbers("SELECT quantity, received FROM purchase_order_line")).toEqual([
      ["110.000000", "40.000000"],
    ]);
  });

  test("refuses phantoms, zero, and orders that are closed", async () => {
    await bringBook();
    await bring("supply", "part_number,quantity,reference\nBOLT,100,PO-1\n");
    await database.query("UPDATE purchase_order SET state = 'cancelled'");
    const error = await refusal(
      bring("supply", "part_number,quantity,reference\nBOX,1,X\nBOLT,0,Y\nBOLT,5,PO-1\n"),
    );
    expect(error.errors.map(({ line, column }) => [line, column])).toEqual([
      [2, "part_number"],
      [3, "quantity"],
      [4, "reference"],
    ]);
  });
});

describe("kit orders", () => {
  const header = "number,kit,serial,priority,options\n";
  beforeEach(bringBook);

  test("are changed by number, with their options", async () => {
    await bring("kit-orders", `${header}KO-1,KIT,029,10,RADIO\nKO-2,KIT,030,20,\n`);
    const answer = await bring("kit-orders", `${header}KO-1,KIT,029,30,\n`);
    expect(answer.rows).toMatchObject([
      { result: "changed", before: { options: ["RADIO"] }, after: { options: [] } },
    ]);
    expect(await numbers("SELECT number, priority FROM kit_order ORDER BY number")).toEqual([
      ["KO-1", "30"],
      ["KO-2", "20"],
    ]);
    expect(await numbers("SELECT * FROM kit_order_option")).toEqual([]);
  });

  test("are refused for parts that are no kits, unknown options, serials that are taken", async () => {
    await bring("kit-orders", `${header}KO-1,KIT,029,10,\n`);
    const error = await refusal(
      bring(
        "kit-orders",
        `${header}KO-2,SUB,,1,\nKO-3,KIT,,1,SAIL\nKO-4,KIT,029,1,\nKO-5,KIT,031,1,\nKO-6,KIT,031,1,\n`,
      ),
    );
    expect(error.errors.map(({ line, column }) => [line, column])).toEqual([
      [2, "kit"],
      [3, "options"],
      [4, "serial"],
      [6, "serial"],
    ]);
  });

  test("that have left stay as they are", async () => {
    await bring("kit-orders", `${header}KO-1,KIT,029,10,\n`);
    await database.query("UPDATE kit_order SET state = 'shipped'");
    expect(resultsOf(await bring("kit-orders", `${header}KO-1,KIT,029,10,\n`))).toEqual(["same"]);
    expect((await refusal(bring("kit-orders", `${header}KO-1,KIT,029,11,\n`))).errors).toMatchObject([
      { line: 2, column: "number" },
    ]);
  });
});

test("a file that cannot be read is refused whole, by line and column", async () => {
  const error = await refusal(bring("parts", 'part_number,sourcing\n"A,buy\n', { dryRun: true }));
  expect(error.code).toBe("invalid");
  expect(error.errors).toMatchObject([{ line: 2, column: "part_number" }]);
  expect((await refusal(bring("parts", "part_number,sourcing,colour\nA,buy,red\n"))).errors).toMatchObject([
    { line: 1, column: "colour", value: "colour" },
  ]);
});

test("a thousand rows of the same file sent at once are written once", async () => {
  const text = `part_number,sourcing\n${Array.from({ length: 1_000 }, (_, at) => `P${at},buy`).join("\n")}\n`;
  await Promise.all([bring("parts", text), bring("parts", text)]);
  expect(await numbers("SELECT COUNT(*), MAX(version) FROM part")).toEqual([["1000", "1"]]);
});
