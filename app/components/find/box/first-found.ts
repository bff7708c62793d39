import type { FindAnswer, Found, FoundKind } from "~/schemas/find/find-answer";

const MOST_SHOWN = 8;
const MOST_OF_A_KIND = 4;

/** The few that are offered while one types, kind by kind. */
export function firstFound({ groups }: FindAnswer): (Found & { kind: FoundKind })[] {
  return groups
    .flatMap(({ kind, found }) => found.slice(0, MOST_OF_A_KIND).map((one) => ({ ...one, kind })))
    .slice(0, MOST_SHOWN);
}
