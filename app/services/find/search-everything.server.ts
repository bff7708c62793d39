import { parseScannedLabel } from "~/domain/scanning/parse-scanned-label";
import type { FindAnswer, FoundGroup } from "~/schemas/find/find-answer";
import { findLabelled } from "./find-labelled.server";
import { searchKind } from "./search-kind.server";
import { SEARCH_KINDS } from "./search-kinds";

const MOST_A_KIND = 20;

/**
 * Parts, bins, lots, suppliers and orders by number or words. Each word stands somewhere in what is found, in any
 * order and case, be it a part of a number; `%`, `_` and `\` are characters like others. Of each kind what is
 * called exactly so stands first, then what begins so. Where nothing is called so, it is tried as a scanned label.
 */
export async function searchEverything(typed: string, most = MOST_A_KIND): Promise<FindAnswer> {
  const q = typed.normalize("NFC").trim();
  if (q === "") return { q, exact: null, groups: [] };
  const plain = await searchKinds(q, most);
  const label = plain.exact.length === 0 ? parseScannedLabel(q) : null;
  if (label === null) return { q, exact: onlyOne(plain.exact), groups: plain.groups };
  const named = label.part ?? label.lot ?? label.bin ?? label.order ?? label.serial;
  const isUnknown = plain.groups.length === 0 && named !== undefined;
  const { groups } = isUnknown ? await searchKinds(named, most) : plain;
  return { q, exact: await findLabelled(label), groups };
}

async function searchKinds(q: string, most: number): Promise<{ exact: string[]; groups: FoundGroup[] }> {
  const searched = await Promise.all(SEARCH_KINDS.map((kind) => searchKind(kind, q, most)));
  return {
    exact: searched.flatMap((one) => one.exact),
    groups: searched.map(({ group }) => group).filter(({ found }) => found.length > 0),
  };
}

function onlyOne(addresses: string[]): string | null {
  return addresses.length === 1 ? addresses[0] : null;
}
