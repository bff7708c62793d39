import { createHash } from "node:crypto";
import { strFromU8, unzipSync } from "fflate";
import { describe, expect, test } from "vitest";
import { type ExportKindName, exportKindNames } from "~/schemas/exports/export-kind-name";
import type { Role } from "~/schemas/people/role";
import { exportBook } from "~/services/exports/export-book.server";
import { exportFile } from "~/services/exports/export-file.server";
import { reverseMovement } from "~/services/stock/reverse-movement.server";
import { useTestDatabase as testDatabase } from "../../support/database";
import { bring, manager, refusal } from "../imports/import-support";
import { expectSoundLedger } from "../stock/expect-sound-ledger";

const database = testDatabase();

const book: Record<Exclude<ExportKindName, "movements">, string> = {
  suppliers:
    'supplier,name,email,note\nTHORN,Thornwick,orders@thornwick.example,"\'=sum of all"\nPELL,=Pell,,-x\n',
  bins: "bin,zone,walk_order\nA1,Main,10\nA2,Main,20\n",
  parts:
    'part_number,description,sourcing,decimals,sold,unit_cost,safety_stock\nKIT,Kit,make,0,1,,\nSUB,Unit,make,0,,,\n-3,"=cmd|\'x\'!A1",buy,0,,0.250,12\nTAPE,"Tape, ""wide""",buy,3,,1.1,\n007,+Box,phantom,0,,,\n',
  structure:
    "parent,component,quantity,scrap,find_number,option,from_date,to_date\nKIT,SUB,1,,10,,,\nKIT,007,1,,20,,,\nSUB,-3,4,0.02,,,,\nSUB,TAPE,,,,,,\n007,TAPE,0.350,,,,2027-01-01,2027-06-01\n007,-3,2,,,RADIO,,\n",
  offers:
    "supplier,part_number,unit_price,from_quantity,preferred\nTHORN,-3,0.25,0,1\nTHORN,-3,0.200,100,1\nPELL,TAPE,1.1,,\n",
  stock:
    "part_number,bin,lot,state,quantity,expires_on\n-3,A1,,usable,100,\nTAPE,A2,L1,usable,10.5,2027-05-01\nTAPE,A2,L2,held,1,\n",
  supply:
    "part_number,quantity,due,reference\n-3,100,2027-01-10,PO-1\n-3,50,,PO-1\nSUB,2,2026-12-20,SO-1\nTAPE,5.5,2027-01-02,\n",
  "kit-orders":
    "number,kit,customer,serial,wanted_on,priority,options,note\nKO-1,KIT,Marsh Rangers,029,2026-12-14,10,RADIO,@home\nKO-2,KIT,,,,20,,\n",
};

async function textOf(kind: ExportKindName, roles: Role[] = ["manager"]): Promise<string> {
  let text = "";
  for await (const piece of exportFile(kind, { person: { ...manager, roles } })) text += piece;
  return text;
}

async function bringBook(): Promise<void> {
  for (const [kind, text] of Object.entries(book)) await bring(kind as ExportKindName, text);
}

async function moveAbout(): Promise<void> {
  await bring(
    "movements",
    "happened_at,kind,part_number,quantity,lot,from_bin,from_state,to_bin,to_state,reason,reference\n2026-11-01T08:00:00.250Z,issue,-3,5,,A1,,,,,KO-1\n2026-11-02T08:00:00Z,move,-3,10,,A1,usable,A2,usable,=why,\n",
  );
  const [{ id }] = await database.query("SELECT MAX(id) AS id FROM movement WHERE kind = 'issue'");
  const actor = { personId: null, roles: manager.roles };
  await reverseMovement({ actor, movementId: Number(id), reason: "Picked twice." });
}

async function sums(): Promise<Record<string, string>> {
  const texts = await Promise.all(exportKindNames.map((kind) => textOf(kind)));
  const hash = (text: string) => createHash("sha256").update(text).digest("hex");
  return Object.fromEntries(exportKindNames.map((kind, place) => [kind, hash(texts[place])]));
}

describe("the whole book", () => {
  test("imports again into an empty program to the same checksums, and changes nothing the second time", async () => {
    await bringBook();
    await moveAbout();
    const before = await sums();
    const files = unzipSync(await exportBook(manager));
    expect(Object.keys(files).sort()).toEqual(exportKindNames.map((kind) => `${kind}.csv`).sort());
    await database.clear();
    for (const kind of exportKindNames) await bring(kind, strFromU8(files[`${kind}.csv`]));
    expect(await sums()).toEqual(before);
    for (const kind of exportKindNames) {
      const { counts } = await bring(kind, strFromU8(files[`${kind}.csv`]), { dryRun: true });
      expect(counts, kind).toMatchObject({ new: 0, changed: 0, refused: 0, removed: 0 });
    }
    await expectSoundLedger();
  });

  test("is the same archive twice, and for the manager alone", async () => {
    await bringBook();
    expect(await exportBook(manager)).toEqual(await exportBook(manager));
    const error = await refusal(exportBook({ ...manager, roles: ["planner"] }));
    expect(error.code).toBe("forbidden");
  });
});

describe("one table", () => {
  test("makes text that looks like a formula harmless and leaves numbers", async () => {
    await bring("parts", book.parts);
    const text = await textOf("parts");
    expect(text).toContain("-3,buy,'=cmd|'x'!A1,EA,0,0,12,");
    expect(text).toContain("007,phantom,'+Box");
  });

  test("leaves costs out for people who may not see them", async () => {
    await bring("parts", book.parts);
    expect(await textOf("parts", ["clerk"])).not.toMatch(/unit_cost|0\.25/);
    expect(() => exportFile("offers", { person: { ...manager, roles: ["clerk"] } })).toThrow(
      expect.objectContaining({ code: "forbidden" }),
    );
  });
});
