import { existsSync } from "node:fs";
import { readFile } from "node:fs/promises";
import path from "node:path";
import { Setting } from "~/db/models/system/setting";
import { readRows } from "~/db/read-rows.server";
import { importFile } from "~/services/imports/import-file.server";
import { seedPeople } from "./seed-people";
import { shiftDates } from "./shift-dates";

interface Seeding {
  folder: string;
  /** The day that the files' own today becomes. */
  today: string;
  say: (sentence: string) => void;
}

async function isEmpty(): Promise<boolean> {
  const [row] = await readRows<{ used: number }>(
    "SELECT EXISTS(SELECT 1 FROM part) OR EXISTS(SELECT 1 FROM person) AS used",
  );
  return Number(row.used) === 0;
}

const kindsInOrder = [
  "suppliers",
  "bins",
  "parts",
  "structure",
  "offers",
  // The movements of the past lead up to the stock, which then only dates the lots.
  "movements",
  "stock",
  "supply",
  "kit-orders",
] as const;

/** Puts the demo firm into an empty database, through the imports that people use; leaves any other alone. */
export async function seedDemo(seeding: Seeding): Promise<boolean> {
  const { folder, today, say } = seeding;
  if (!(await isEmpty())) return false;
  const person = await seedPeople();
  say("people: 5");
  for (const kind of kindsInOrder) {
    const file = path.join(folder, `${kind}.csv`);
    if (kind === "movements" && !existsSync(file)) continue;
    const bytes = shiftDates(await readFile(file), today);
    const { counts } = await importFile(kind, { bytes, person });
    say(`${kind}: ${counts.new + counts.changed + counts.same}`);
  }
  await Setting.create({ name: "demo", value: true });
  return true;
}
