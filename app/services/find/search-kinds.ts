import type { FoundKind } from "~/schemas/find/find-answer";

export interface SearchKind {
  kind: FoundKind;
  from: string;
  /** What it is called on the shelf or the paper. */
  name: string;
  /** Key column and how what was typed becomes such a key: compared exactly, by the index where there is one. */
  key: string;
  keyOf: (typed: string) => string;
  /** What else is shown beside the name. */
  words: string;
  /** The part whose page shows it. */
  part: string;
  /** A word may stand in any of these. */
  searched: readonly string[];
}

const upper = (typed: string) => typed.toUpperCase();

/** Columns compared byte by byte are searched as people read: without regard to case. */
const folded = (column: string) => `${column} COLLATE utf8mb4_unicode_ci`;

export const SEARCH_KINDS: readonly SearchKind[] = [
  {
    kind: "part",
    from: "part",
    name: "part.part_number",
    key: "part.part_key",
    keyOf: upper,
    words: "part.description",
    part: "NULL",
    searched: ["part.part_number", "part.description"],
  },
  {
    kind: "bin",
    from: "bin",
    name: "bin.code",
    key: "bin.bin_key",
    keyOf: upper,
    words: "CONCAT_WS(', ', NULLIF(bin.zone, ''), NULLIF(bin.description, ''))",
    part: "NULL",
    searched: ["bin.code", "bin.zone", "bin.description"],
  },
  {
    kind: "lot",
    from: "lot JOIN part ON part.id = lot.part_id AND lot.lot_code <> ''",
    name: "lot.lot_code",
    key: folded("lot.lot_code"),
    keyOf: (typed) => typed,
    words: "CONCAT_WS(' ', part.part_number, part.description)",
    part: "part.part_number",
    searched: [folded("lot.lot_code")],
  },
  {
    kind: "supplier",
    from: "supplier",
    name: "supplier.code",
    key: "supplier.supplier_key",
    keyOf: upper,
    words: "supplier.name",
    part: "NULL",
    searched: ["supplier.code", "supplier.name"],
  },
  {
    kind: "purchase-order",
    from: "purchase_order LEFT JOIN supplier ON supplier.id = purchase_order.supplier_id",
    name: "purchase_order.number",
    key: folded("purchase_order.number"),
    keyOf: (typed) => typed,
    words: "COALESCE(supplier.name, '')",
    part: "NULL",
    searched: [folded("purchase_order.number"), "supplier.code", "supplier.name"],
  },
  {
    kind: "shop-order",
    from: "shop_order JOIN part ON part.id = shop_order.part_id",
    name: "shop_order.number",
    key: folded("shop_order.number"),
    keyOf: (typed) => typed,
    words: "CONCAT_WS(' ', part.part_number, part.description)",
    part: "part.part_number",
    searched: [folded("shop_order.number"), "part.part_number", "part.description"],
  },
  {
    kind: "kit-order",
    from: "kit_order JOIN part ON part.id = kit_order.part_id",
    name: "kit_order.number",
    key: folded("kit_order.number"),
    keyOf: (typed) => typed,
    words:
      "CONCAT_WS(', ', part.part_number, NULLIF(kit_order.customer, ''), CONCAT('serial ', kit_order.serial))",
    part: "part.part_number",
    searched: [
      folded("kit_order.number"),
      "kit_order.customer",
      folded("kit_order.serial"),
      "part.part_number",
    ],
  },
];
