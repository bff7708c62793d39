/** The kinds of CSV file that the web takes, as the address names them. */
export const importKindNames = [
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

export type ImportKindName = (typeof importKindNames)[number];
