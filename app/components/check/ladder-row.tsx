import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { formatDate } from "~/utils/format/format-date";
import { formatMoney } from "~/utils/format/format-money";
import { formatNumber } from "~/utils/format/format-number";
import type { LadderRow as Row } from "./ladder-rows";
import { Rung } from "./rung";
import { StopperTags } from "./stopper-tags";

interface LadderRowProps {
  row: Row;
  page: CheckPageAnswer;
  isTopReady: boolean;
  /** Some rows of the ladder stand for several kits: their numbers take more room. */
  hasRuns: boolean;
}

/** One rung with its number, and, where it cannot be climbed, the date, the money and the parts it hangs on. */
export function LadderRow({ row, page, isTopReady, hasRuns }: LadderRowProps) {
  const isRun = row.from !== row.to;
  return (
    <tr
      className={`grid grid-cols-[auto_auto_minmax(0,1fr)] ${row.ready && !isRun ? "min-h-10" : "min-h-14"}`}
    >
      <th
        scope="row"
        className={`figure pt-[7px] pr-2 text-right sm:pr-3 font-normal text-soft ${hasRuns ? "w-[5.5rem] sm:w-[6.5rem]" : "w-8 sm:w-11"}`}
      >
        {isRun ? `${formatNumber(row.from)}–${formatNumber(row.to)}` : row.to}
      </th>
      <td className="relative w-16 sm:w-36">
        <Rung ready={row.ready} isRun={isRun} />
        <span className="sr-only">{row.ready ? "ready" : "stopped"}</span>
      </td>
      <td className="min-w-0 pt-[7px] pb-3 pl-3 sm:pl-4">
        {row.ready ? (
          <span className={isTopReady ? "" : "sr-only"}>
            from what is here, by{" "}
            <strong className="figure font-semibold">
              {formatDate(row.readyOn, { today: page.answer?.today, short: true })}
            </strong>
          </span>
        ) : (
          <Stopped row={row} page={page} />
        )}
      </td>
    </tr>
  );
}

function Stopped({ row, page }: { row: Row; page: CheckPageAnswer }) {
  return (
    <>
      <p>
        by{" "}
        <strong className="figure font-semibold">
          {formatDate(row.readyOn, { today: page.answer?.today, short: true })}
        </strong>
        {row.cost !== null && (
          <>
            {" "}
            <span className="ml-2 text-soft">
              for <span className="figure">{formatMoney(row.cost)}</span> in parts
            </span>
          </>
        )}
      </p>
      <StopperTags
        fresh={row.fresh}
        carried={row.carried}
        parts={page.parts}
        question={page.question}
        kits={row.to}
      />
    </>
  );
}
