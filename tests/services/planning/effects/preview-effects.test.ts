import { beforeEach, describe, expect, test } from "vitest";
import { type BookChangeInput, effectsQuestionSchema } from "~/schemas/planning/effects";
import { cancelKitOrder } from "~/services/kit-orders/cancel-kit-order.server";
import { createKitOrder } from "~/services/kit-orders/create-kit-order.server";
import { updateKitOrder } from "~/services/kit-orders/update-kit-order.server";
import { previewEffects } from "~/services/planning/effects/preview-effects.server";
import { getPlanBook } from "~/services/planning/get-plan-book.server";
import { getShipLine } from "~/services/planning/get-ship-line.server";
import { useTestDatabase as testDatabase } from "../../../support/database";
import { bring, manager, refusal } from "../../imports/import-support";
import { expectSoundLedger } from "../../stock/expect-sound-ledger";
import { issue, post, receive, usable } from "../../stock/stock-builders";

const database = testDatabase();

const held = (bin: string) => ({ bin, state: "held" as const });

/** Five orders of a kit of one drive and two bolts; a drive takes four bolts; resin in grams, one lot of it old. */
beforeEach(async () => {
  await bring("bins", "bin,zone,walk_order\nA1,Store,1\nA2,Store,2\n");
  await bring(
    "parts",
    `part_number,sourcing,decimals,lead_time_days,sold
KIT,make,0,2,1
DRIVE,make,0,3,0
BOLT,buy,0,10,0
LAMP,buy,0,20,0
RESIN,buy,3,5,0
`,
  );
  await bring(
    "structure",
    `parent,component,quantity,option,to_serial
KIT,DRIVE,1,,
KIT,BOLT,2,,
KIT,LAMP,1,NIGHT,
KIT,RESIN,0.350,,
DRIVE,BOLT,4,,
`,
  );
  await bring(
    "stock",
    `part_number,bin,lot,state,quantity,expires_on
BOLT,A1,L1,usable,10,
BOLT,A2,L2,usable,8,
BOLT,A1,L3,held,6,
DRIVE,A1,,usable,1,
LAMP,A1,,usable,1,
RESIN,A1,R1,usable,0.700,2999-02-01
RESIN,A1,R2,usable,0.700,
`,
  );
  await bring(
    "supply",
    "part_number,quantity,due,reference\nBOLT,30,2999-01-10,PO-1\nRESIN,9,2999-03-01,PO-2\n",
  );
  await bring(
    "kit-orders",
    `number,kit,priority,wanted_on,options
KO-0001,KIT,10,,
KO-0002,KIT,20,,NIGHT
KO-0003,KIT,30,2999-04-01,
KO-0004,KIT,40,,
KO-0005,KIT,50,,NIGHT
`,
  );
});

function preview(change: BookChangeInput) {
  return previewEffects(effectsQuestionSchema.parse({ change }).change);
}

/** The ship line as it is now, without the number of its book. */
async function shipLine() {
  const { revision: _, ...line } = await getShipLine();
  return line;
}

const order = (rest: Record<string, unknown> = {}) => ({
  kit: "KIT",
  options: [],
  serial: "",
  wantedOn: "",
  priority: 15,
  ...rest,
});

const acts: [string, BookChangeInput, () => Promise<unknown>][] = [
  [
    "a new order amid the others",
    { kitOrders: { add: [order({ options: ["NIGHT"] })] } },
    () => createKitOrder(order({ options: ["NIGHT"] }), manager),
  ],
  [
    "a new order with the priority and date of another",
    { kitOrders: { add: [order({ priority: 30, wantedOn: "2999-04-01" })] } },
    () => createKitOrder(order({ priority: 30, wantedOn: "2999-04-01" }), manager),
  ],
  [
    "an order moved to the front, with an option and a date",
    { kitOrders: { change: [{ number: "KO-0005", priority: 1, wantedOn: "2999-01-01" }] } },
    () =>
      updateKitOrder(
        "KO-0005",
        { ...order({ priority: 1, wantedOn: "2999-01-01", options: ["NIGHT"] }), version: 1 },
        manager,
      ),
  ],
  [
    "an order that loses its option",
    { kitOrders: { change: [{ number: "KO-0002", options: [] }] } },
    () => updateKitOrder("KO-0002", { ...order({ priority: 20 }), version: 1 }, manager),
  ],
  ["an order cancelled", { kitOrders: { cancel: ["KO-0001"] } }, () => cancelKitOrder("KO-0001", 1, manager)],
  [
    "stock received",
    { stock: [{ partNumber: "BOLT", bin: "A1", change: "+3" }] },
    () => post([receive("BOLT", "3", "A1")]),
  ],
  [
    "stock received into a lot that will expire",
    { stock: [{ partNumber: "RESIN", bin: "A1", lot: "R2", change: "5", expiresOn: "2999-01-05" }] },
    () => post([{ ...receive("RESIN", "5", "A1"), lot: "R2", expiresOn: "2999-01-05" }]),
  ],
  [
    "stock issued from a lot",
    { stock: [{ partNumber: "BOLT", bin: "A2", lot: "L2", change: "-5" }] },
    () => post([{ ...issue("BOLT", "5", "A2"), lot: "L2" }]),
  ],
  [
    "stock moved between bins",
    {
      stock: [
        { partNumber: "BOLT", bin: "A1", lot: "L1", change: "-10" },
        { partNumber: "BOLT", bin: "A2", lot: "L1", change: "+10" },
      ],
    },
    () =>
      post([
        { kind: "move", partNumber: "BOLT", lot: "L1", quantity: "10", from: usable("A1"), to: usable("A2") },
      ]),
  ],
  [
    "a lot held",
    { hold: [{ partNumber: "BOLT", lot: "L1" }] },
    () =>
      post([
        {
          kind: "hold",
          partNumber: "BOLT",
          lot: "L1",
          quantity: "10",
          from: usable("A1"),
          to: held("A1"),
          reason: "Rust",
        },
      ]),
  ],
  [
    "some of a lot held",
    {
      stock: [
        { partNumber: "BOLT", bin: "A1", lot: "L1", change: "-4" },
        { partNumber: "BOLT", bin: "A1", lot: "L1", state: "held", change: "+4" },
      ],
    },
    () =>
      post([
        {
          kind: "hold",
          partNumber: "BOLT",
          lot: "L1",
          quantity: "4",
          from: usable("A1"),
          to: held("A1"),
          reason: "Rust",
        },
      ]),
  ],
  [
    "a lot released",
    { release: [{ partNumber: "BOLT", lot: "L3" }] },
    () =>
      post([
        {
          kind: "release",
          partNumber: "BOLT",
          lot: "L3",
          quantity: "6",
          from: held("A1"),
          to: usable("A1"),
          reason: "Clean",
        },
      ]),
  ],
  [
    "supply added",
    { supply: { add: [{ partNumber: "LAMP", quantity: "4", due: "2999-01-02", reference: "PO-3" }] } },
    () => bring("supply", "part_number,quantity,due,reference\nLAMP,4,2999-01-02,PO-3\n"),
  ],
  [
    "supply moved",
    { supply: { move: [{ reference: "PO-1", partNumber: "BOLT", due: "2999-06-01" }] } },
    () => bring("supply", "part_number,quantity,due,reference\nBOLT,30,2999-06-01,PO-1\n"),
  ],
  [
    "supply removed",
    { supply: { remove: [{ reference: "PO-2" }] } },
    () =>
      database.query("UPDATE purchase_order SET state = 'cancelled' WHERE number = 'PO-2'").then(raiseOrders),
  ],
  [
    "a part's lead time",
    { parts: [{ part_number: "DRIVE", lead_time_days: "9" }] },
    () => bring("parts", "part_number,sourcing,lead_time_days\nDRIVE,make,9\n"),
  ],
  [
    "a structure replaced",
    { structure: [{ parent: "drive", lines: [{ component: "BOLT", quantity: "2" }] }] },
    () => bring("structure", "parent,component,quantity\nDRIVE,BOLT,2\n"),
  ],
  [
    "an option that the structure no longer offers to orders that have it",
    {
      structure: [
        {
          parent: "KIT",
          lines: [
            { component: "DRIVE", quantity: "1" },
            { component: "BOLT", quantity: "2" },
          ],
        },
      ],
    },
    () => bring("structure", "parent,component,quantity\nKIT,DRIVE,1\nKIT,BOLT,2\n"),
  ],
  [
    "everything at once",
    {
      stock: [{ partNumber: "BOLT", change: "+6" }],
      hold: [{ partNumber: "RESIN", lot: "R2" }],
      parts: [{ part_number: "LAMP", lead_time_days: "40" }],
      kitOrders: { cancel: ["KO-0003"], add: [order({ priority: 5 })] },
    },
    async () => {
      await post([
        receive("BOLT", "6", "A1"),
        {
          kind: "hold",
          partNumber: "RESIN",
          lot: "R2",
          quantity: "0.7",
          from: usable("A1"),
          to: held("A1"),
          reason: "Old",
        },
      ]);
      await bring("parts", "part_number,sourcing,lead_time_days\nLAMP,buy,40\n");
      await cancelKitOrder("KO-0003", 1, manager);
      await createKitOrder(order({ priority: 5 }), manager);
    },
  ],
];

function raiseOrders() {
  return database.query("UPDATE revision SET value = value + 1 WHERE name = 'orders'");
}

describe("what an act would do", () => {
  test.each(acts)("is what it does: %s", async (_, change, act) => {
    const before = await shipLine();
    const told = await preview(change);
    expect(await shipLine()).toEqual(before);
    expect(told.before).toEqual(before);
    await act();
    expect(told.after).toEqual(await shipLine());
    await expectSoundLedger();
  });

  test("with a line shorter than the queue, and components promised to builds", async () => {
    await database.query("REPLACE INTO setting (name, value) VALUES ('ship-line-kits', '2')");
    await bring("supply", "part_number,quantity,due,reference\nDRIVE,2,2999-01-05,SO-1\n");
    await database.query(
      `INSERT INTO shop_order_component (shop_order_id, part_id, promised, picked)
       SELECT shop_order.id, part.id, 8, 3 FROM shop_order JOIN part ON part.part_number = 'BOLT'`,
    );
    await raiseOrders();
    const told = await preview({ stock: [{ partNumber: "BOLT", change: "-9" }] });
    expect(told.before.of).toBe(2);
    await post([
      { ...issue("BOLT", "8", "A2"), lot: "L2" },
      { ...issue("BOLT", "1", "A1"), lot: "L1" },
    ]);
    expect(told.after).toEqual(await shipLine());
  });

  test("names the orders that become ready and those that stop", async () => {
    const line = await shipLine();
    expect(line).toMatchObject({ ready: 3, of: 5, next: { kitOrder: "KO-0004" } });
    const more = await preview({ stock: [{ partNumber: "BOLT", change: "+4" }] });
    expect(more).toMatchObject({ becomeReady: ["KO-0004"], stop: [], after: { ready: 4 } });
    const first = await preview({ kitOrders: { change: [{ number: "KO-0005", priority: 1 }] } });
    expect(first.becomeReady).toEqual(["KO-0005"]);
    expect(first.stop.map(({ kitOrder, stoppers }) => [kitOrder, stoppers])).toEqual([
      ["KO-0002", [{ partNumber: "LAMP", missing: "1" }]],
      ["KO-0003", [{ partNumber: "BOLT", missing: "2" }]],
    ]);
    expect(first.own).toMatchObject([{ kitOrder: "KO-0005", place: 1, planned: { isReady: true } }]);
  });

  test("says where a new order would stand, also past the line", async () => {
    await database.query("REPLACE INTO setting (name, value) VALUES ('ship-line-kits', '4')");
    const told = await preview({ kitOrders: { add: [order({ priority: 90, options: ["NIGHT"] })] } });
    expect(told.after).toEqual(told.before);
    expect(told.own).toMatchObject([
      {
        kitOrder: "KO-0006",
        place: 6,
        planned: { isReady: false, stoppers: expect.arrayContaining([{ partNumber: "LAMP", missing: "1" }]) },
      },
    ]);
  });
});

test("an order saved as it is has no effect to speak of", async () => {
  const told = await preview({ kitOrders: { change: [{ number: "KO-0004", priority: 40, options: [] }] } });
  expect(told).toMatchObject({ own: [], stop: [], becomeReady: [] });
  expect(told.after).toEqual(told.before);
});

test("an order that was stored with a serial of another kind hides no other", async () => {
  await database.query("UPDATE kit_order SET serial = 'blue' WHERE number = 'KO-0002'");
  await raiseOrders();
  expect(await shipLine()).toMatchObject({ ready: 3, of: 5 });
});

test("nothing is stored, and the book stays as it is", async () => {
  const tables = [
    "movement",
    "balance",
    "lot",
    "kit_order",
    "structure_line",
    "part",
    "audit_event",
    "revision",
  ];
  const rows = () => Promise.all(tables.map((table) => database.query(`SELECT * FROM ${table} ORDER BY 1`)));
  const [before, book] = [await rows(), await getPlanBook()];
  const copy = JSON.stringify([book.rows, book.kitOrders]);
  for (const [, change] of acts) await preview(change);
  expect(await rows()).toEqual(before);
  expect(await getPlanBook()).toBe(book);
  expect(JSON.stringify([book.rows, book.kitOrders])).toBe(copy);
});

test.each([
  ["an unknown part", { stock: [{ partNumber: "NUT", change: "1" }] }, "stock.0.partNumber", /no part NUT/],
  [
    "more than is there",
    { stock: [{ partNumber: "BOLT", lot: "L1", change: "-11" }] },
    "stock.0.change",
    /only 10 of BOLT/,
  ],
  ["half a bolt", { stock: [{ partNumber: "BOLT", change: "0.5" }] }, "stock.0.change", /0 decimals/],
  ["a lot that is not usable", { hold: [{ partNumber: "BOLT", lot: "L9" }] }, "hold.0.lot", /lot L9/],
  ["a lot that is not held", { release: [{ partNumber: "BOLT", lot: "L1" }] }, "release.0", /is held/],
  ["an order that is not open", { supply: { move: [{ reference: "PO-9" }] } }, "supply.move.0", /PO-9/],
  [
    "supply of half a bolt",
    { supply: { add: [{ partNumber: "BOLT", quantity: "1.5" }] } },
    "supply.add.0.quantity",
    /decimals/,
  ],
  ["too few decimals", { parts: [{ part_number: "RESIN", decimals: "1" }] }, "parts", /0\.35 of RESIN/],
  [
    "a loop",
    { structure: [{ parent: "DRIVE", lines: [{ component: "KIT", quantity: "1" }] }] },
    "structure",
    /loop/,
  ],
  [
    "half a bolt in a structure",
    { structure: [{ parent: "DRIVE", lines: [{ component: "BOLT", quantity: "0.5" }] }] },
    "structure",
    /decimals/,
  ],
  ["a kit that is none", { kitOrders: { add: [order({ kit: "DRIVE" })] } }, "kitOrders.add.0.kit", /no kit/],
  [
    "an option that the kit has not",
    { kitOrders: { add: [order({ options: ["FLOATS"] })] } },
    "kitOrders.add.0.options",
    /no option FLOATS/,
  ],
  [
    "a number that is taken",
    { kitOrders: { add: [order({ number: "KO-0001" })] } },
    "kitOrders.add.0.number",
    /already/,
  ],
  ["a closed kit order", { kitOrders: { cancel: ["KO-9"] } }, "kitOrders.cancel.0", /no open kit order/],
] as [string, BookChangeInput, string, RegExp][])("refuses %s", async (_, change, field, sentence) => {
  const error = await refusal(preview(change));
  expect(error).toMatchObject({ code: "invalid", errors: [{ field: `change.${field}` }] });
  expect(error.message).toMatch(sentence);
});

test("what the change does not touch is not made again", async () => {
  const book = await getPlanBook();
  const { changeBook } = await import("~/services/planning/effects/change-book.server");
  const made = async (change: BookChangeInput) =>
    changeBook(book, effectsQuestionSchema.parse({ change }).change);
  expect((await made({ stock: [{ partNumber: "BOLT", change: "+1" }] })).structure).toBe(book.structure);
  const cancelled = await made({ kitOrders: { cancel: ["KO-0001"] } });
  expect(cancelled.structure).toBe(book.structure);
  expect(cancelled.supplies).toBe(book.supplies);
});
