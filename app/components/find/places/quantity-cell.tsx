import { formatNumber } from "~/utils/format/format-number";
import { unitSymbol } from "~/utils/format/unit-symbol";

/** A quantity with its unit, where rows have units of their own. */
export function QuantityCell({ quantity, unit }: { quantity: string; unit: string }) {
  const symbol = unitSymbol(unit);
  return (
    <span className="figure whitespace-nowrap">
      {formatNumber(quantity)}
      {symbol && ` ${symbol}`}
    </span>
  );
}
