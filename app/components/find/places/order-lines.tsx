import type { OrderLine } from "~/schemas/find/place-pages";
import { formatMoney } from "~/utils/format/format-money";
import { type BookColumn, BookTable } from "../book-table";
import { DueWords } from "../due-words";
import { PartLink } from "../part-link";
import { PlaceLink } from "../place-link";
import { QuantityCell } from "./quantity-cell";

interface OrderLinesProps {
  title: string;
  lines: OrderLine[];
  /** Lines of many orders say which is theirs. */
  namesOrder: boolean;
  seesCosts: boolean;
  today: string;
  empty: string;
}

/** Lines of purchase orders: what was ordered, what has come, what is still to come. */
export function OrderLines({ title, lines, namesOrder, seesCosts, today, empty }: OrderLinesProps) {
  const part: BookColumn<OrderLine> = {
    head: "Part",
    cell: (line) => <PartLink partNumber={line.partNumber} description={line.description} />,
  };
  const order: BookColumn<OrderLine> = {
    head: "Order",
    cell: ({ number }) => <PlaceLink folder="purchase-orders" name={number} />,
  };
  const price: BookColumn<OrderLine> = {
    head: "Price of one",
    isRight: true,
    cell: ({ unitPrice }) => (
      <span className="figure">{unitPrice === null ? "not said" : formatMoney(unitPrice)}</span>
    ),
  };
  const columns: BookColumn<OrderLine>[] = [
    part,
    ...(namesOrder ? [order] : []),
    {
      head: "Due",
      cell: ({ due, open }) => <DueWords due={due} today={Number(open) === 0 ? "" : today} />,
    },
    {
      head: "Ordered",
      isRight: true,
      cell: ({ quantity, unit }) => <QuantityCell quantity={quantity} unit={unit} />,
    },
    {
      head: "Received",
      isRight: true,
      cell: ({ received, unit }) => <QuantityCell quantity={received} unit={unit} />,
    },
    {
      head: "To come",
      isRight: true,
      cell: ({ open, unit }) => <QuantityCell quantity={open} unit={unit} />,
    },
    ...(seesCosts ? [price] : []),
  ];
  return (
    <BookTable
      title={title}
      columns={columns}
      rows={lines}
      keyOf={({ number, line }) => `${number} ${line}`}
      empty={empty}
    />
  );
}
