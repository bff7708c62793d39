import { Link } from "react-router";
import type { PartPage as PartPageAnswer } from "~/schemas/find/part-page";
import { OfferTable } from "../offer-table";
import { PartOrders } from "./part-orders";
import { PartRules } from "./part-rules";
import { partSentence } from "./part-sentence";
import { PartShelves } from "./part-shelves";
import { PartStops } from "./part-stops";
import { PartComponents, PartParents } from "./part-structure";
import { PartSums } from "./part-sums";

/** All that the book knows of one part, to read. */
export function PartPage({ page }: { page: PartPageAnswer }) {
  const { part, components, offers, today, seesCosts } = page;
  const address = `/find/parts/${encodeURIComponent(part.partNumber)}`;
  const isBuilt = part.sourcing !== "buy" || components.length > 0;
  return (
    <>
      <h1 className="figure break-words text-2xl font-semibold sm:text-[2.25rem]">{part.partNumber}</h1>
      {part.description && <p className="mt-1 max-w-prose text-xl">{part.description}</p>}
      <p className="mt-1 max-w-prose text-soft">{partSentence(part)}</p>
      <div className="mt-6 grid items-start gap-4 lg:grid-cols-[minmax(18rem,1fr)_minmax(0,3fr)]">
        <div className="grid min-w-0 gap-4 sm:max-lg:grid-cols-2 sm:max-lg:items-start">
          <PartSums part={part} />
          <PartStops page={page} />
          <PartRules page={page} />
        </div>
        <div className="grid min-w-0 gap-4">
          <PartShelves part={part} today={today} />
          <PartOrders part={part} today={today} />
          {isBuilt && (
            <PartComponents
              components={components}
              aside={
                components.length > 0 && (
                  <Link className="py-1 underline" to={`${address}/structure`}>
                    Every level
                  </Link>
                )
              }
            />
          )}
          <PartParents parents={part.whereUsed} unit={part.unit} />
          {(part.sourcing === "buy" || offers.length > 0) && (
            <OfferTable offers={offers} first="supplier" seesCosts={seesCosts} />
          )}
        </div>
      </div>
    </>
  );
}
