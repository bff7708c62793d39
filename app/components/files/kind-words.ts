import type { ImportKindName } from "~/schemas/imports/import-kind-name";

/** The kinds of file as people call them, and what bringing one in does to what is there. */
export const KIND_WORDS: Readonly<Record<ImportKindName, { name: string; effect: string }>> = {
  suppliers: { name: "suppliers", effect: "Suppliers that the file does not name stay as they are." },
  bins: { name: "bins", effect: "Bins that the file does not name stay as they are." },
  parts: {
    name: "parts",
    effect:
      "Parts and columns that the file does not name stay as they are; an empty cell takes the default.",
  },
  structure: {
    name: "structures",
    effect: "All lines of each parent that the file names are replaced; other parents stay as they are.",
  },
  offers: { name: "suppliers' offers", effect: "Offers that the file does not name stay as they are." },
  movements: {
    name: "movements of stock",
    effect: "Every row is posted to the ledger in its order. The same file again posts nothing.",
  },
  stock: {
    name: "stock",
    effect:
      "Each part, bin, lot and state that the file names is set to its quantity by an adjustment; others stay.",
  },
  supply: {
    name: "open orders",
    effect:
      "A row of a bought part is a line of a purchase order, one of a made part a shop order; others stay.",
  },
  "kit-orders": { name: "kit orders", effect: "Kit orders that the file does not name stay as they are." },
};
