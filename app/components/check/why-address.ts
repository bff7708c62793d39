import type { CheckQuestion } from "~/schemas/planning/check-answer";
import { checkSearch } from "./check-search";

export interface WhyAsked {
  /** Of Check; null where the open kit orders are asked. */
  question: CheckQuestion | null;
  /** The last of the open kit orders that are asked. */
  through?: string | null;
  part: string;
  /** A rung of the ladder. */
  kits?: number;
  with?: "stock" | "orders";
  via?: readonly string[];
}

/** Where a number of a part opens to its causes. */
export function whyAddress({
  question,
  through,
  part,
  kits,
  with: lane = "stock",
  via = [],
}: WhyAsked): string {
  const search = new URLSearchParams(question === null ? "" : checkSearch(question));
  if (through) search.set("through", through);
  search.set("part", part);
  if (kits !== undefined) search.set("kits", String(kits));
  if (lane === "orders") search.set("with", lane);
  for (const one of via) search.append("via", one);
  return `/check/why?${search}`;
}
