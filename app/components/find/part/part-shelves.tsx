import type { PartAnswer, PartBalance } from "~/schemas/parts/part-answer";
import { formatDate } from "~/utils/format/format-date";
import { formatNumber } from "~/utils/format/format-number";
import { type BookColumn, BookTable } from "../book-table";
import { HeldCaution } from "../held-caution";
import { PlaceLink } from "../place-link";
import { StandingMark } from "../standing-mark";

/** Where the part lies: a line a bin, lot and state. */
export function PartShelves({ part, today }: { part: PartAnswer; today: string }) {
  const columns: BookColumn<PartBalance>[] = [
    { head: "Bin", cell: ({ bin }) => <PlaceLink folder="bins" name={bin} /> },
    {
      head: "Lot",
      cell: ({ lot }) =>
        lot === null ? <span className="text-soft">none</span> : <span className="figure">{lot}</span>,
    },
    { head: "State", cell: ({ standing }) => <StandingMark standing={standing} /> },
    {
      head: "Use by",
      cell: ({ expiresOn }) =>
        expiresOn === null ? (
          <span className="text-soft">no date</span>
        ) : (
          <span className="figure whitespace-nowrap">{formatDate(expiresOn, { today, short: true })}</span>
        ),
    },
    {
      head: "Quantity",
      isRight: true,
      cell: ({ quantity }) => <span className="figure">{formatNumber(quantity)}</span>,
    },
  ];
  const isOut = part.balances.some(({ standing }) => standing === "held" || standing === "expired");
  return (
    <BookTable
      title="On the shelves"
      columns={columns}
      rows={part.balances}
      keyOf={({ bin, lot, state }) => [bin, lot, state].join("\n")}
      idOf={({ lot }, at) =>
        lot !== null && part.balances.findIndex((one) => one.lot === lot) === at ? `lot-${lot}` : undefined
      }
      empty="There is none in any bin."
    >
      {isOut && <HeldCaution />}
    </BookTable>
  );
}
