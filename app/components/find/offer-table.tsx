import type { PresentedOffer } from "~/schemas/find/part-page";
import { formatMoney } from "~/utils/format/format-money";
import { formatNumber } from "~/utils/format/format-number";
import { unitSymbol } from "~/utils/format/unit-symbol";
import { type BookColumn, BookTable } from "./book-table";
import { PartLink } from "./part-link";
import { PlaceLink } from "./place-link";

interface OfferTableProps {
  offers: PresentedOffer[];
  /** What stands first: whose offer it is, or of which part. */
  first: "supplier" | "part";
  seesCosts: boolean;
}

const figure = (text: string | null) => (
  <span className="figure">{text === null ? "none" : formatNumber(text)}</span>
);

const COLUMNS: BookColumn<PresentedOffer>[] = [
  {
    head: "Their number",
    cell: ({ supplierPartNumber }) => <span className="figure">{supplierPartNumber || "none"}</span>,
  },
  { head: "Bought in", cell: buyingWords },
  {
    head: "Lead time",
    cell: ({ leadTimeDays }) => (leadTimeDays === null ? "not said" : `${leadTimeDays} days`),
  },
  { head: "Minimum", isRight: true, cell: ({ minimum }) => figure(minimum) },
  { head: "Multiple", isRight: true, cell: ({ multiple }) => figure(multiple) },
  { head: "From", isRight: true, cell: ({ fromQuantity }) => figure(fromQuantity) },
];

const PRICE: BookColumn<PresentedOffer> = {
  head: "Price",
  isRight: true,
  cell: ({ unitPrice, currency }) =>
    unitPrice === null ? (
      ""
    ) : (
      <span className="figure whitespace-nowrap">{`${formatMoney(unitPrice)} ${currency}`}</span>
    ),
};

function buyingWords({ buyingUnit, perBuyingUnit, unit }: PresentedOffer): string {
  if (buyingUnit === unit) return unitSymbol(unit) || "pieces";
  return `${unitSymbol(buyingUnit) || buyingUnit} of ${[formatNumber(perBuyingUnit), unitSymbol(unit)].filter(Boolean).join(" ")}`;
}

/** Offers, a line a price step; minimum, multiple, step and price are in buying units. */
export function OfferTable({ offers, first, seesCosts }: OfferTableProps) {
  const lead: BookColumn<PresentedOffer> =
    first === "part"
      ? {
          head: "Part",
          cell: (offer) => <PartLink partNumber={offer.partNumber} description={offer.description} />,
        }
      : { head: "Supplier", cell: (offer) => <SupplierCell offer={offer} /> };
  return (
    <BookTable
      title="Offers"
      aside={
        seesCosts ? "quantities and prices in what it is bought in" : "quantities in what it is bought in"
      }
      columns={[lead, ...COLUMNS, ...(seesCosts ? [PRICE] : [])]}
      rows={offers}
      keyOf={({ supplier, partNumber, fromQuantity }) => [supplier, partNumber, fromQuantity].join("\n")}
      empty={first === "part" ? "They offer nothing that is in the book." : "No supplier offers it yet."}
    />
  );
}

function SupplierCell({ offer }: { offer: PresentedOffer }) {
  return (
    <>
      <PlaceLink folder="suppliers" name={offer.supplier} says={offer.supplierName} />
      {offer.preferred && <span className="block text-[0.9375rem] text-soft">first choice</span>}
    </>
  );
}
