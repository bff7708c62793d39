import { useState } from "react";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { formatNumber } from "~/utils/format/format-number";
import { checkSearch } from "./check-search";
import { StopperLine } from "./stopper-line";
import { stopperRows } from "./stopper-rows";
import { whyAddress } from "./why-address";

const FIRST_SHOWN = 25;

const HEADS = ["Part", "Kits covered", "Missing", "On order", "Short", "Unit", "Here on", "Cost"];

/** The parts that stop kits, worst first. On a narrow page each part becomes a small sheet of its own. */
export function StoppersTable({ page }: { page: CheckPageAnswer }) {
  const [isWhole, setIsWhole] = useState(false);
  const rows = stopperRows(page);
  const shown = isWhole ? rows : rows.slice(0, FIRST_SHOWN);
  const heads = page.seesCosts ? HEADS : HEADS.slice(0, -1);
  return (
    <section aria-labelledby="stoppers-title" className="sheet">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <h2 id="stoppers-title" className="text-lg">
          What stops them
        </h2>
        <p className="text-soft">{countWords(rows.length, page.totalParts)}</p>
      </div>
      {rows.length > 0 && (
        <table aria-labelledby="stoppers-title" className="mt-2 w-full max-lg:block">
          <thead className="max-lg:sr-only">
            <tr className="border-ink border-b-2 text-left align-bottom text-[0.9375rem]">
              {heads.map((head, place) => (
                <th
                  key={head}
                  scope="col"
                  className={`whitespace-nowrap py-2 pr-4 font-normal last:pr-0 ${place > 1 && head !== "Unit" ? "text-right" : ""}`}
                >
                  {head}
                </th>
              ))}
            </tr>
          </thead>
          <tbody className="max-lg:block">
            {shown.map((row) => (
              <StopperLine
                key={row.partNumber}
                row={row}
                asked={page.question.quantity}
                seesCosts={page.seesCosts}
                ifHere={`/check?${checkSearch({ ...page.question, ifs: [...page.question.ifs, row.ifHere] })}`}
                why={whyAddress({ question: page.question, part: row.partNumber })}
              />
            ))}
          </tbody>
        </table>
      )}
      {shown.length < rows.length && (
        <button type="button" className="button mt-4 print:hidden" onClick={() => setIsWhole(true)}>
          Show all {formatNumber(rows.length)}
        </button>
      )}
    </section>
  );
}

function countWords(count: number, total: number): string {
  if (count === 0) return `none of ${formatNumber(total)} parts`;
  return `${formatNumber(count)} of ${formatNumber(total)} parts${count > 1 ? ", worst first" : ""}`;
}
