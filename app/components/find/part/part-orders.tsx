import type { OpenOrder, PartAnswer } from "~/schemas/parts/part-answer";
import { formatNumber } from "~/utils/format/format-number";
import { type BookColumn, BookTable } from "../book-table";
import { DueWords } from "../due-words";
import { PlaceLink } from "../place-link";

/** What is to come, soonest first, and what of the stock is spoken for. */
export function PartOrders({ part, today }: { part: PartAnswer; today: string }) {
  const columns: BookColumn<OpenOrder>[] = [
    { head: "Order", cell: ({ kind, reference }) => <PlaceLink folder={`${kind}s`} name={reference} /> },
    {
      head: "From",
      cell: ({ kind, supplier }) => (kind === "shop-order" ? "our bench" : (supplier ?? "no supplier named")),
    },
    { head: "Due", cell: ({ due }) => <DueWords due={due} today={today} /> },
    {
      head: "To come",
      isRight: true,
      cell: ({ quantity }) => <span className="figure">{formatNumber(quantity)}</span>,
    },
  ];
  return (
    <>
      <BookTable
        title="On order"
        columns={columns}
        rows={part.onOrder}
        keyOf={({ reference }, at) => `${reference} ${at}`}
        empty="None is on order."
      />
      {part.promised.length > 0 && (
        <BookTable
          title="Promised to builds"
          columns={[
            {
              head: "Shop order",
              cell: ({ reference }) => <PlaceLink folder="shop-orders" name={reference} />,
            },
            {
              head: "Promised",
              isRight: true,
              cell: ({ quantity }) => <span className="figure">{formatNumber(quantity)}</span>,
            },
          ]}
          rows={part.promised}
          keyOf={({ reference }) => reference}
          empty=""
        />
      )}
    </>
  );
}
