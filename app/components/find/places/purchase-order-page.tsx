import type { PurchaseOrderPage as PurchaseOrderPageAnswer } from "~/schemas/find/place-pages";
import { formatDate } from "~/utils/format/format-date";
import { PlaceLink } from "../place-link";
import { OrderLines } from "./order-lines";
import { PageHead } from "./page-head";

const STATES: Record<PurchaseOrderPageAnswer["state"], string> = {
  draft: "It is not sent yet.",
  sent: "It is with the supplier.",
  closed: "It is closed: nothing more comes of it.",
  cancelled: "It is cancelled.",
};

/** A purchase order to read. */
export function PurchaseOrderPage({ order }: { order: PurchaseOrderPageAnswer }) {
  const { number, state, supplier, supplierName, orderedOn, note, lines, seesCosts, today } = order;
  return (
    <>
      <PageHead name={number}>
        <p>
          Purchase order{" "}
          {supplier === null ? (
            "without a supplier"
          ) : (
            <>
              to <PlaceLink folder="suppliers" name={supplier} says={supplierName ?? supplier} />
            </>
          )}
          {orderedOn !== null && `, ordered on ${formatDate(orderedOn, { today })}`}. {STATES[state]}
        </p>
        {note && <p className="text-base text-soft">{note}</p>}
      </PageHead>
      <OrderLines
        title="Lines"
        lines={lines}
        namesOrder={false}
        seesCosts={seesCosts}
        today={today}
        empty="There is no line on it."
      />
    </>
  );
}
