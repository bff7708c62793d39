import type { FindAnswer } from "~/schemas/find/find-answer";
import { searchKind } from "./search-kind.server";
import { SEARCH_KINDS } from "./search-kinds";

const MOST_A_KIND = 20;

/**
 * Parts, bins, lots, suppliers and orders by number or words. Each word stands somewhere in what is found, in any
 * order and case, be it a part of a number; `%`, `_` and `\` are characters like others. Of each kind what is
 * called exactly so stands first, then what begins so.
 */
export async function searchEverything(typed: string, most = MOST_A_KIND): Promise<FindAnswer> {
  const q = typed.normalize("NFC").trim();
  if (q === "") return { q, exact: null, groups: [] };
  const searched = await Promise.all(SEARCH_KINDS.map((kind) => searchKind(kind, q, most)));
  const exact = searched.flatMap((one) => one.exact);
  return {
    q,
    exact: exact.length === 1 ? exact[0] : null,
    groups: searched.map(({ group }) => group).filter(({ found }) => found.length > 0),
  };
}
