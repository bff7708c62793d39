import { beforeEach, describe, expect, it } from "vitest";
import { searchEverything } from "~/services/find/search-everything.server";
import { useTestDatabase } from "../../support/database";
import { bring } from "../imports/import-support";

useTestDatabase();

beforeEach(async () => {
  await bring("bins", "bin,zone,description\nA1,Store,Left wall\nHB-2041-B,Cold room,\n");
  await bring(
    "parts",
    `part_number,description,sourcing,sold
KIT,Kit one,make,1
HB-2041,"Bearing, fan hub, sealed",buy,0
HB-20410,"Bearing, pulley",buy,0
X-HB-2041,"Puller for HB",buy,0
A%B,"Cloth, 50% linen",buy,0
A_B,Underline,buy,0
AXB,Neither,buy,0
C\\D,Backslash,buy,0
ÉT-1,Épissure,buy,0
`,
  );
  await bring("structure", "parent,component,quantity\nKIT,HB-2041,2\n");
  await bring("suppliers", "supplier,name,currency\nNORTHQUAY,Northquay Bearings,EUR\n");
  await bring("stock", "part_number,bin,lot,quantity\nHB-2041,A1,L-77,4\n");
  await bring("supply", "part_number,quantity,due,reference\nHB-2041,30,2999-01-10,PO-26-0901\n");
  await bring("kit-orders", "number,kit,customer,serial\nKO-0147,KIT,Marsh Rangers,029\n");
});

async function names(typed: string): Promise<Record<string, string[]>> {
  const { groups } = await searchEverything(typed);
  return Object.fromEntries(groups.map(({ kind, found }) => [kind, found.map(({ name }) => name)]));
}

describe("searching everything", () => {
  it("puts what is called so first, then what begins so, then the rest", async () => {
    expect((await names("hb-2041")).part).toEqual(["HB-2041", "HB-20410", "X-HB-2041"]);
  });

  it("finds by a piece of the number and by words in any order and case", async () => {
    expect((await names("2041")).part).toEqual(["HB-2041", "HB-20410", "X-HB-2041"]);
    expect((await names("SEALED bearing")).part).toEqual(["HB-2041"]);
    expect((await names("hub 2041")).part).toEqual(["HB-2041"]);
    expect((await names("bearing nowhere")).part).toBeUndefined();
  });

  it("takes %, _ and \\ as characters like others", async () => {
    expect((await names("A%B")).part).toEqual(["A%B"]);
    expect((await names("A_B")).part).toEqual(["A_B"]);
    expect((await names("C\\D")).part).toEqual(["C\\D"]);
    expect(await names("%")).toEqual({ part: ["A%B"] });
    expect(await names("!_")).toEqual({});
  });

  it("finds bins, lots, suppliers and orders, by what belongs to them too", async () => {
    expect(await names("l-77")).toEqual({ lot: ["L-77"] });
    expect((await names("cold")).bin).toEqual(["HB-2041-B"]);
    expect((await names("northquay")).supplier).toEqual(["NORTHQUAY"]);
    expect(await names("0901")).toEqual({ "purchase-order": ["PO-26-0901"] });
    expect(await names("rangers marsh")).toEqual({ "kit-order": ["KO-0147"] });
    expect(await names("029")).toEqual({ "kit-order": ["KO-0147"] });
  });

  it("says the page of the one thing that is called exactly so", async () => {
    expect((await searchEverything(" hb-2041 ")).exact).toBe("/find/parts/HB-2041");
    expect((await searchEverything("a1")).exact).toBe("/find/bins/A1");
    expect((await searchEverything("ko-0147")).exact).toBe("/find/kit-orders/KO-0147");
    expect((await searchEverything("L-77")).exact).toBe("/find/parts/HB-2041#lot-L-77");
    expect((await searchEverything("c\\d")).exact).toBe("/find/parts/C%5CD");
    expect((await searchEverything("ét-1")).exact).toBe(`/find/parts/${encodeURIComponent("ÉT-1")}`);
    expect((await searchEverything("HB")).exact).toBeNull();
  });

  it("leaves the choice where two things are called the same", async () => {
    await bring("bins", "bin\nHB-2041\n");
    const { exact, groups } = await searchEverything("HB-2041");
    expect(exact).toBeNull();
    expect(groups.map(({ kind, found }) => [kind, found[0].name])).toEqual([
      ["part", "HB-2041"],
      ["bin", "HB-2041"],
    ]);
  });

  it("reads a scanned label where nothing is called so", async () => {
    expect((await searchEverything("PHB-2041")).exact).toBe("/find/parts/HB-2041");
    expect((await searchEverything("1TL-77")).exact).toBe("/find/parts/HB-2041#lot-L-77");
    expect((await searchEverything("LA1")).exact).toBe("/find/bins/A1");
    expect((await searchEverything("KPO-26-0901")).exact).toBe("/find/purchase-orders/PO-26-0901");
    expect((await searchEverything("S029")).exact).toBe("/find/kit-orders/KO-0147");
    const label = "[)>\u001e06\u001dPHB-2041\u001d1TL-77\u001dQ4\u001e\u0004";
    expect((await searchEverything(label)).exact).toBe("/find/parts/HB-2041#lot-L-77");
    const unknownLot = await searchEverything("[)>\u001e06\u001dPHB-2041\u001d1TL-78\u001e\u0004");
    expect(unknownLot.exact).toBe("/find/parts/HB-2041");
    expect(unknownLot.groups[0].found[0].name).toBe("HB-2041");
    await bring("parts", "part_number,sourcing\nPHB-2041,buy\n");
    expect((await searchEverything("PHB-2041")).exact).toBe("/find/parts/PHB-2041");
  });

  it("shows so many of a kind and counts the others", async () => {
    const { groups } = await searchEverything("b", 2);
    const [parts] = groups;
    expect(parts.found).toHaveLength(2);
    expect(parts.more).toBe(5);
  });

  it("answers nothing to nothing", async () => {
    expect(await searchEverything("  ")).toEqual({ q: "", exact: null, groups: [] });
  });
});
