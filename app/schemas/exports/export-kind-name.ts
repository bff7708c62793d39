/** The tables of the book that leave as CSV, in the order in which they come in again. */
export const exportKindNames = [
  "suppliers",
  "bins",
  "parts",
  "structure",
  "offers",
  "movements",
  "stock",
  "supply",
  "kit-orders",
] as const;

export type ExportKindName = (typeof exportKindNames)[number];
