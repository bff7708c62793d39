import { readRows } from "~/db/read-rows.server";
import type { ScannedLabel } from "~/domain/scanning/parse-scanned-label";
import type { FoundKind } from "~/schemas/find/find-answer";
import { foundAddress } from "./found-address";
import { searchKind } from "./search-kind.server";
import { SEARCH_KINDS } from "./search-kinds";

/** One more than one: enough to know that it is not the only one. */
const TWO = 2;

/**
 * The page of the one thing that a scanned label names: the lot of its part, else the part, lot, bin, order or kit
 * order of its serial. Null where it names nothing in the book, or several things.
 */
export async function findLabelled(label: ScannedLabel): Promise<string | null> {
  const { part, lot, bin, order, serial } = label;
  const [parts, lots] = [await called(part, "part"), await called(lot, "lot")];
  const ofPart = lots.filter((address) => address.startsWith(`${parts[0]}#`));
  const found = [
    ofPart,
    parts,
    part === undefined ? lots : [],
    await called(bin, "bin"),
    await called(order, "purchase-order", "shop-order", "kit-order"),
    await kitOrdersWith(serial),
  ].find((addresses) => addresses.length > 0);
  return found?.length === 1 ? found[0] : null;
}

async function called(name: string | undefined, ...kinds: FoundKind[]): Promise<string[]> {
  if (name === undefined) return [];
  const searched = SEARCH_KINDS.filter(({ kind }) => kinds.includes(kind));
  const answers = await Promise.all(searched.map((kind) => searchKind(kind, name, TWO)));
  return answers.flatMap(({ exact }) => exact);
}

async function kitOrdersWith(serial: string | undefined): Promise<string[]> {
  if (serial === undefined) return [];
  const orders = await readRows<{ number: string }>(
    "SELECT number FROM kit_order WHERE serial = :serial ORDER BY id DESC LIMIT 2",
    { serial },
  );
  return orders.map(({ number }) => foundAddress("kit-order", number, null));
}
