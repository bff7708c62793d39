import { beforeEach, expect, it } from "vitest";
import type { Role } from "~/schemas/people/role";
import { getBinPage } from "~/services/find/get-bin-page.server";
import { getPartPage } from "~/services/find/get-part-page.server";
import { getPurchaseOrderPage } from "~/services/find/get-purchase-order-page.server";
import { getShopOrderPage } from "~/services/find/get-shop-order-page.server";
import { getSupplierPage } from "~/services/find/get-supplier-page.server";
import { useTestDatabase } from "../../support/database";
import { bring, manager, refusal } from "../imports/import-support";

const database = useTestDatabase();

const as = (role: Role) => ({ ...manager, roles: [role] });

/** 12 bolts usable, 3 held, 5 expired; 4 of the usable promised to a build; 30 on order, long overdue. */
beforeEach(async () => {
  await bring("bins", "bin,zone\nA1,Store\nA2,Store\n");
  await bring(
    "parts",
    `part_number,description,sourcing,decimals,unit,lead_time_days,unit_cost,mass_kg,sold
KIT,Kit one,make,,,2,,,1
DRIVE,"Drive, lift",make,,,3,,,0
BOLT,"Bolt, hex",buy,,,10,0.25,0.012,0
CABLE,"Cable, steel",buy,3,MTR,10,2.50,,0
`,
  );
  await bring(
    "structure",
    "parent,component,quantity,find_number,option\nKIT,DRIVE,1,10,\nKIT,BOLT,2,20,\nKIT,CABLE,0.35,30,NIGHT\nDRIVE,BOLT,4,10,\n",
  );
  await bring(
    "stock",
    `part_number,bin,lot,state,quantity,expires_on
BOLT,A1,L1,usable,12,
BOLT,A1,L2,held,3,
BOLT,A2,L3,usable,5,2020-01-01
`,
  );
  await bring(
    "suppliers",
    "supplier,name,currency,email\nBOLTS,Thornwick Fastenings,EUR,orders@thornwick.example\n",
  );
  await bring(
    "offers",
    "supplier,part_number,buying_unit,per_buying_unit,unit_price,currency\nBOLTS,BOLT,XBX,100,19.90,EUR\n",
  );
  await bring("supply", "part_number,quantity,due,reference\nBOLT,30,2020-01-10,PO-1\n");
  await bring("kit-orders", "number,kit,customer\nKO-1,KIT,Ferry Trust\nKO-2,KIT,\nKO-3,KIT,\n");
  await database.query(
    "INSERT INTO shop_order (id, number, part_id, quantity, state) SELECT 1, 'SO-1', id, 1, 'released' FROM part WHERE part_key = 'DRIVE'",
  );
  await database.query(
    "INSERT INTO shop_order_component (shop_order_id, part_id, promised) SELECT 1, id, 4 FROM part WHERE part_key = 'BOLT'",
  );
  await database.query("UPDATE purchase_order SET supplier_id = (SELECT id FROM supplier)");
});

it("sums a part's stock so that the figures add up", async () => {
  const { part } = await getPartPage("bolt", manager);
  expect(part.totals).toEqual({
    onHand: "20",
    usable: "12",
    held: "3",
    expired: "5",
    staged: "0",
    withSupplier: "0",
    promised: "4",
    available: "8",
    onOrder: "30",
  });
  expect(part.balances.map(({ lot, standing }) => [lot, standing])).toEqual([
    ["L1", "usable"],
    ["L2", "held"],
    ["L3", "expired"],
  ]);
  expect(part.onOrder).toMatchObject([{ kind: "purchase-order", reference: "PO-1", isOverdue: true }]);
});

it("says where a part is used, what it is made of, what one weighs and costs", async () => {
  const bolt = await getPartPage("BOLT", manager);
  expect(
    bolt.part.whereUsed.map(({ partNumber, findNumber, quantity }) => [partNumber, findNumber, quantity]),
  ).toEqual([
    ["DRIVE", "10", "4"],
    ["KIT", "20", "2"],
  ]);
  const kit = await getPartPage("KIT", manager);
  expect(kit.components.map(({ partNumber, quantity, option }) => [partNumber, quantity, option])).toEqual([
    ["DRIVE", "1", null],
    ["BOLT", "2", null],
    ["CABLE", "0.35", "NIGHT"],
  ]);
  // Six bolts; the cable is only there with its option.
  expect(kit.rolledUpMass).toEqual({ massKg: "0.072", unknown: [] });
  expect(kit.rolledUpCost).toBe("1.50");
});

it("says which open kit orders wait for the part", async () => {
  const { stops, ordersAsked } = await getPartPage("BOLT", manager);
  expect(ordersAsked).toBe(3);
  // The first kit takes two bolts and the drive under way counts as its four: 12 bolts make two kits.
  expect(stops).toEqual([{ kitOrder: "KO-3", missing: "6" }]);
});

it.each(["clerk", "builder"] as const)("tells a %s no cost and no price anywhere", async (role) => {
  const pages = [
    await getPartPage("BOLT", as(role)),
    await getPartPage("KIT", as(role)),
    await getSupplierPage("BOLTS", as(role)),
    await getPurchaseOrderPage("PO-1", as(role)),
  ];
  const said = JSON.stringify(pages);
  expect(said).not.toMatch(/"(unitCost|rolledUpCost|unitPrice)":"/);
  expect(said).not.toContain("19.9");
});

it("shows costs and prices to the purchaser", async () => {
  const page = await getPartPage("BOLT", as("purchaser"));
  expect(page.part.unitCost).toBe("0.25");
  expect(page.offers).toMatchObject([{ supplier: "BOLTS", unitPrice: "19.9", perBuyingUnit: "100" }]);
});

it("shows what is in a bin, a supplier's open orders and what a build waits for", async () => {
  expect(
    (await getBinPage("a1")).balances.map(({ lot, standing, quantity }) => [lot, standing, quantity]),
  ).toEqual([
    ["L1", "usable", "12"],
    ["L2", "held", "3"],
  ]);
  expect((await getSupplierPage("bolts", manager)).lines).toMatchObject([{ number: "PO-1", open: "30" }]);
  expect((await getPurchaseOrderPage("PO-1", manager)).supplierName).toBe("Thornwick Fastenings");
  expect(await getShopOrderPage("SO-1")).toMatchObject({
    partNumber: "DRIVE",
    components: [{ partNumber: "BOLT", promised: "4", picked: "0" }],
  });
});

it("says what is not there", async () => {
  for (const ask of [
    () => getPartPage("NOPE", manager),
    () => getBinPage("NOPE"),
    () => getSupplierPage("NOPE", manager),
    () => getPurchaseOrderPage("NOPE", manager),
    () => getShopOrderPage("NOPE"),
  ]) {
    expect(await refusal(ask())).toMatchObject({
      code: "not-found",
      message: expect.stringContaining("NOPE"),
    });
  }
});
