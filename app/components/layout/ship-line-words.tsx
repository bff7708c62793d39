import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { formatDate } from "~/utils/format/format-date";
import { formatNumber } from "~/utils/format/format-number";
import { cardinal } from "~/utils/format/number-words";

interface ShipLineWordsProps {
  answer: ShipLineAnswer;
  /** The last question went unanswered: what is shown is the answer before it. */
  stale: boolean;
}

/** The ship line in words: ready, next stop, the day all can go. */
export function ShipLineWords({ answer, stale }: ShipLineWordsProps) {
  const { ready, of, next, allBy } = answer;
  const stopper = next?.stoppers[0];
  return (
    <span className="flex min-w-0 flex-wrap items-baseline gap-x-6">
      <strong className="whitespace-nowrap">
        {ready} of {of} ready
      </strong>
      {next !== null && stopper !== undefined && (
        <span className="min-w-0">
          <span className="figure text-[0.94em]">{next.kitOrder}</span> stops at{" "}
          <span className="figure text-[0.94em]">{stopper.partNumber}</span>, {formatNumber(stopper.missing)}{" "}
          missing
        </span>
      )}
      {allBy !== null && next !== null && (
        <span className="hidden whitespace-nowrap md:inline">
          all {cardinal(of)} by{" "}
          <strong>{formatDate(allBy, { today: new Date().toISOString().slice(0, 10) })}</strong>
        </span>
      )}
      {next === null && <span>Nothing stops the open kit orders.</span>}
      {stale && <span className="text-foot-soft">as last heard: the server does not answer</span>}
    </span>
  );
}
