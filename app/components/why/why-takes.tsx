import { useState } from "react";
import { Link } from "react-router";
import { whyAddress } from "~/components/check/why-address";
import type { WhyAnswer } from "~/schemas/planning/why";
import { sayQuantity } from "./say-quantity";
import { whyAsked } from "./why-path";
import { WhyRow, WhyRows } from "./why-rows";

const FEW = 12;

/** What starting it takes of its own parts, what lacks first: the way down. */
export function WhyTakes({ why, via }: { why: WhyAnswer; via: string[] }) {
  const [isWhole, setIsWhole] = useState(false);
  const { components } = why;
  if (components.length === 0) return null;
  const lacking = components.filter((row) => row.lacking !== null).length;
  const most = isWhole ? components.length : Math.max(FEW, Math.min(lacking, 2 * FEW));
  const loss =
    why.started === why.rest ? "" : `, ${sayQuantity(why.started, why.part)} started for its yield`;
  return (
    <WhyRows title={`What that takes${loss}`}>
      {components.slice(0, most).map(({ component, need, lacking: lacks }) => (
        <WhyRow key={component.partNumber} figure={sayQuantity(need, component)}>
          <Link
            to={whyAddress({ ...whyAsked(why), part: component.partNumber, via })}
            preventScrollReset
            className="figure py-1 underline"
          >
            {component.partNumber}
          </Link>{" "}
          {component.description}
          {lacks !== null && (
            <span className="block text-[0.9375rem]">
              {component.sourcing === "buy" ? (
                <span className="font-bold text-stop">
                  {sayQuantity(lacks, component)} {why.with === "stock" ? "missing" : "short"} in the whole
                  plan
                </span>
              ) : (
                <span className="text-soft">
                  {sayQuantity(lacks, component)}{" "}
                  {component.sourcing === "make" ? "to be built" : "passed on"} in the whole plan
                </span>
              )}
            </span>
          )}
        </WhyRow>
      ))}
      {components.length > most && (
        <li className="border-line border-t py-2 print:hidden">
          <button type="button" className="py-1 underline" onClick={() => setIsWhole(true)}>
            All {components.length} parts
          </button>
        </li>
      )}
    </WhyRows>
  );
}
