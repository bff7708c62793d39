import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { formatNumber } from "~/utils/format/format-number";

const MOST_LISTED = 12;

/** What opens above the ship line: all that the next order waits for, and where to ask more. */
export function ShipLineWhy({ answer }: { answer: ShipLineAnswer }) {
  const { next } = answer;
  const stoppers = next?.stoppers ?? [];
  const rest = stoppers.length - MOST_LISTED;
  return (
    <div className="mx-auto max-h-[50dvh] w-full max-w-[112rem] overflow-y-auto border-foot-soft/40 border-t px-4 py-4 sm:px-10">
      {next === null ? (
        <p>Every open kit order has what it needs on the shelves.</p>
      ) : (
        <>
          <p>
            <span className="figure">{next.kitOrder}</span>, one{" "}
            <span className="figure">{next.partNumber}</span>, is the first in order of priority that cannot
            ship. It waits for:
          </p>
          <ul className="mt-2 grid gap-x-8 gap-y-1 sm:grid-cols-2 lg:grid-cols-4">
            {stoppers.slice(0, MOST_LISTED).map((stopper) => (
              <li key={stopper.partNumber}>
                <Link
                  to={whyAddress({ question: null, through: next.kitOrder, part: stopper.partNumber })}
                  className="figure inline-block py-1 font-semibold underline"
                >
                  {stopper.partNumber}
                </Link>{" "}
                <span className="figure text-foot-stop">{formatNumber(stopper.missing)}</span> missing
              </li>
            ))}
            {rest > 0 && <li>and {rest} more</li>}
          </ul>
        </>
      )}
      <p className="mt-3 flex flex-wrap gap-x-8 gap-y-1">
        {next !== null && (
          <Link
            className="py-1 underline"
            to={`/check?kit=${encodeURIComponent(next.partNumber)}&quantity=${answer.of}`}
          >
            Check {answer.of} of {next.partNumber}
          </Link>
        )}
        <Link className="py-1 underline" to="/pack/kit-orders">
          Kit orders, first to last
        </Link>
      </p>
    </div>
  );
}
