/** What people come to do. A verb stands in the bar once it has a page. */
export const VERBS = [
  { word: "Check", to: "/check" },
  { word: "Pack", to: "/pack/kit-orders" },
  { word: "Find", to: "/find" },
] as const;
