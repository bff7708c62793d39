import type { PresentedPart } from "~/schemas/parts/part-answer";
import { unitSymbol } from "~/utils/format/unit-symbol";

type Named = Pick<PresentedPart, "sourcing" | "unit" | "sold">;

const COMES: Record<Named["sourcing"], string> = {
  buy: "Bought",
  make: "Made here",
  phantom: "Passed through: never stored as itself, its need goes to its components",
};

/** How the part comes to be and what it is counted in, as one sentence. */
export function partSentence({ sourcing, unit, sold }: Named): string {
  const symbol = unitSymbol(unit);
  const counted = symbol === "" ? "counted in pieces" : `counted in ${symbol}`;
  return `${COMES[sourcing]}${sold ? " and sold as a kit" : ""}, ${counted}.`;
}
