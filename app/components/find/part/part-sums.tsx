import type { PartAnswer } from "~/schemas/parts/part-answer";
import { formatNumber } from "~/utils/format/format-number";
import { type Fact, FactList } from "../fact-list";

/** What is here, what of it can be had, what is coming: figures that add up from the top down. */
export function PartSums({ part }: { part: PartAnswer }) {
  const { totals } = part;
  const figure = (quantity: string) => <span className="figure">{formatNumber(quantity)}</span>;
  const less = (name: string, quantity: string): Fact[] =>
    Number(quantity) === 0
      ? []
      : [{ name, value: <span className="figure">− {formatNumber(quantity)}</span> }];
  const facts: Fact[] = [
    { name: "On hand", value: figure(totals.onHand) },
    ...less("held", totals.held),
    ...less("expired", totals.expired),
    ...less("staged for orders", totals.staged),
    ...less("promised to builds", totals.promised),
    { name: "Available", value: <strong>{figure(totals.available)}</strong> },
    { name: "On order", value: figure(totals.onOrder) },
  ];
  if (Number(totals.withSupplier) !== 0)
    facts.push({ name: "With suppliers", value: figure(totals.withSupplier) });
  return (
    <section aria-labelledby="sums-title" className="sheet">
      <h2 id="sums-title" className="text-lg">
        Stock
      </h2>
      <FactList facts={facts} />
    </section>
  );
}
