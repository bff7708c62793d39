import type { WhyPart } from "~/schemas/planning/why";
import { formatQuantity } from "~/utils/format/format-quantity";
import { unitSymbol } from "~/utils/format/unit-symbol";

/** `0.350 m`, `12`: a quantity of a part with its unit, pieces without. */
export function sayQuantity(quantity: string, part: Pick<WhyPart, "unit" | "decimals">): string {
  const unit = unitSymbol(part.unit);
  const figure = formatQuantity(quantity, part.decimals);
  return unit === "" ? figure : `${figure} ${unit}`;
}
