import { readRows } from "~/db/read-rows.server";

const KITS_SHOWN = 10;

/** How many open kit orders the ship line speaks of. */
export async function kitsShown(): Promise<number> {
  const [setting] = await readRows<{ value: unknown }>(
    "SELECT value FROM setting WHERE name = 'ship-line-kits'",
  );
  const count = Number(setting?.value ?? KITS_SHOWN);
  return Number.isInteger(count) && count > 0 ? count : KITS_SHOWN;
}
