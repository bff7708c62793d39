/** What a search looks through, in the order in which it answers. */
export const FOUND_KINDS = [
  "part",
  "bin",
  "lot",
  "supplier",
  "purchase-order",
  "shop-order",
  "kit-order",
] as const;

export type FoundKind = (typeof FOUND_KINDS)[number];

export interface Found {
  /** Number, code or name by which people know it. */
  name: string;
  /** What else is worth reading: description, supplier, customer. */
  words: string;
  /** The page of it. */
  to: string;
}

export interface FoundGroup {
  kind: FoundKind;
  found: Found[];
  /** How many more there are of this kind. */
  more: number;
}

/** The answer of `GET /api/find`. */
export interface FindAnswer {
  q: string;
  /** The page of the one thing that is called exactly so; null where nothing or several things are. */
  exact: string | null;
  groups: FoundGroup[];
}
