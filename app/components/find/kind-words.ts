import type { FoundKind } from "~/schemas/find/find-answer";

/** The heading of each kind of thing found. */
export const KIND_WORDS: Record<FoundKind, string> = {
  part: "Parts",
  bin: "Bins",
  lot: "Lots",
  supplier: "Suppliers",
  "purchase-order": "Purchase orders",
  "shop-order": "Shop orders",
  "kit-order": "Kit orders",
};
