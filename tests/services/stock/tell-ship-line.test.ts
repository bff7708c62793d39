import { afterEach, beforeEach, expect, it, vi } from "vitest";
import { getShipLine } from "~/services/planning/get-ship-line.server";
import { postAndTell } from "~/services/stock/tell/post-and-tell.server";
import { useTestDatabase } from "../../support/database";
import { manager } from "../imports/import-support";
import { expectSoundLedger } from "./expect-sound-ledger";
import { buildBin, buildPart, newKey, receive } from "./stock-builders";

vi.mock("~/services/planning/get-ship-line.server", { spy: true });

useTestDatabase();

beforeEach(async () => {
  await buildPart("HB-2041");
  await buildBin("A12");
});
afterEach(expectSoundLedger);

it("lets a posting stand whose ship line cannot be worked out, and tells it to the same key later", async () => {
  vi.mocked(getShipLine).mockRejectedValueOnce(new Error("no plan"));
  const posting = { person: manager, key: newKey(), movements: [receive("HB-2041", "4", "A12")] };
  const first = await postAndTell(posting);
  expect(first.shipLine).toBeNull();
  const again = await postAndTell(posting);
  expect(again).toEqual({ ...first, shipLine: expect.objectContaining({ ready: 0, of: 0 }) });
  expect(await postAndTell(posting)).toEqual(again);
});
