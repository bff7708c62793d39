import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { PartPage } from "~/schemas/find/part-page";
import { formatNumber } from "~/utils/format/format-number";
import { PlaceLink } from "../place-link";

/** Which of the open kit orders wait for this part. */
export function PartStops({ page }: { page: PartPage }) {
  const { part, stops, ordersAsked } = page;
  const last = stops.at(-1);
  return (
    <section aria-labelledby="stops-title" className="sheet">
      <h2 id="stops-title" className={`text-lg ${stops.length > 0 ? "text-stop" : ""}`}>
        What it stops now
      </h2>
      {last === undefined ? (
        <p className="mt-1 text-soft">{restWords(ordersAsked)}</p>
      ) : (
        <>
          <ul className="mt-1">
            {stops.map(({ kitOrder, missing }) => (
              <li
                key={kitOrder}
                className="flex flex-wrap items-baseline justify-between gap-x-6 border-line border-b py-1.5"
              >
                <PlaceLink folder="kit-orders" name={kitOrder} />
                <span>
                  <span className="figure">{formatNumber(missing)}</span> missing
                </span>
              </li>
            ))}
          </ul>
          <p className="mt-3 flex flex-wrap gap-x-6 gap-y-1">
            <Link
              className="py-1 underline"
              to={whyAddress({ question: null, through: last.kitOrder, part: part.partNumber })}
            >
              Why
            </Link>
            <Link className="py-1 underline" to="/check">
              Check all kits
            </Link>
          </p>
        </>
      )}
    </section>
  );
}

function restWords(ordersAsked: number): string {
  if (ordersAsked === 0) return "There is no open kit order for it to stop.";
  return `None of the next ${formatNumber(ordersAsked)} kit orders waits for it.`;
}
