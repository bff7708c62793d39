import { useQuery } from "@tanstack/react-query";
import { useRef } from "react";
import { shipLineQuery } from "~/hooks/queries/ship-line";
import { useCloseDetails } from "~/hooks/use-close-details";
import { useRefreshAfterAct } from "~/hooks/use-refresh-after-act";
import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { CotterPin } from "./cotter-pin";
import { ShipLineWhy } from "./ship-line-why";
import { ShipLineWords } from "./ship-line-words";

/** The strip at the foot of every page: how many of the open kit orders can ship, and what stops the next. */
export function ShipLine() {
  const { data, error } = useQuery(shipLineQuery());
  const details = useRef<HTMLDetailsElement>(null);
  useCloseDetails(details);
  useRefreshAfterAct();

  return (
    <section
      aria-label="Ship line"
      className="on-foot sticky bottom-0 z-20 border-foot-soft/40 border-t bg-foot text-foot-ink print:static"
    >
      {data !== undefined && data.of > 0 ? (
        <details ref={details} className="group">
          <summary className="mx-auto flex min-h-14 w-full max-w-[112rem] items-center gap-x-6 px-4 py-2 -outline-offset-4 sm:px-10">
            <Pins answer={data} />
            <ShipLineWords answer={data} stale={error !== null} />
            <span className="ml-auto shrink-0 self-center border-foot-ink border-b">
              <span className="group-open:hidden">why</span>
              <span className="hidden group-open:inline">close</span>
            </span>
          </summary>
          <ShipLineWhy answer={data} />
        </details>
      ) : (
        <p className="mx-auto flex min-h-14 w-full max-w-[112rem] items-center px-4 py-2 text-foot-soft sm:px-10">
          {emptyLine(data, error)}
        </p>
      )}
    </section>
  );
}

function emptyLine(data: ShipLineAnswer | undefined, error: Error | null): string {
  if (data !== undefined)
    return "No kit orders yet: enter the first under Pack, and this line says whether it can ship.";
  return error === null ? "Asking what can ship …" : error.message;
}

function Pins({ answer }: { answer: ShipLineAnswer }) {
  const places = Array.from({ length: Math.min(answer.of, 12) }, (_, place) => place + 1);
  return (
    <span className="hidden shrink-0 gap-[5px] sm:flex">
      {places.map((place) => (
        <CotterPin
          key={place}
          seated={place <= answer.ready}
          className={`h-5 w-3 ${place <= answer.ready ? "" : "text-foot-stop"}`}
        />
      ))}
    </span>
  );
}
