import type { ShopOrderComponent, ShopOrderPage as ShopOrderPageAnswer } from "~/schemas/find/place-pages";
import { type BookColumn, BookTable } from "../book-table";
import { DueWords } from "../due-words";
import { FactList } from "../fact-list";
import { PartLink } from "../part-link";
import { PageHead } from "./page-head";
import { QuantityCell } from "./quantity-cell";

const STATES: Record<ShopOrderPageAnswer["state"], string> = {
  planned: "It is planned and not yet at the bench.",
  released: "It is at the bench.",
  finished: "It is finished.",
  cancelled: "It is cancelled.",
};

const COLUMNS: BookColumn<ShopOrderComponent>[] = [
  { head: "Part", cell: (row) => <PartLink partNumber={row.partNumber} description={row.description} /> },
  {
    head: "Promised",
    isRight: true,
    cell: ({ promised, unit }) => <QuantityCell quantity={promised} unit={unit} />,
  },
  {
    head: "Picked",
    isRight: true,
    cell: ({ picked, unit }) => <QuantityCell quantity={picked} unit={unit} />,
  },
];

/** A shop order to read. */
export function ShopOrderPage({ order }: { order: ShopOrderPageAnswer }) {
  const { number, state, partNumber, description, unit, quantity, finished, due, components, today } = order;
  const isOpen = state === "planned" || state === "released";
  return (
    <>
      <PageHead name={number}>
        <p>Shop order. {STATES[state]}</p>
      </PageHead>
      <div className="grid gap-4">
        <section aria-labelledby="makes-title" className="sheet max-w-2xl">
          <h2 id="makes-title" className="text-lg">
            What it makes
          </h2>
          <FactList
            facts={[
              { name: "Part", value: <PartLink partNumber={partNumber} description={description} /> },
              { name: "Quantity", value: <QuantityCell quantity={quantity} unit={unit} /> },
              { name: "Finished", value: <QuantityCell quantity={finished} unit={unit} /> },
              { name: "Due", value: <DueWords due={due} today={isOpen ? today : ""} /> },
            ]}
          />
        </section>
        <BookTable
          title="Components"
          columns={COLUMNS}
          rows={components}
          keyOf={(row) => row.partNumber}
          empty="Nothing is promised to it."
        />
      </div>
    </>
  );
}
