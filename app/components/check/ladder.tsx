import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { LadderRow } from "./ladder-row";
import { ladderRows } from "./ladder-rows";

/** The answer as a picture: a rung a kit, from the floor up. It is a table to those who cannot see it. */
export function Ladder({ page }: { page: CheckPageAnswer }) {
  if (page.answer === null) return null;
  const rows = ladderRows(page.answer.ladder, page.stoppers);
  const topReady = rows.findLast((row) => row.ready)?.to ?? null;
  return (
    <section aria-labelledby="ladder-title">
      <h2 id="ladder-title" className="mb-3 text-lg">
        The ladder
      </h2>
      <table aria-labelledby="ladder-title" className="block">
        <thead className="sr-only">
          <tr>
            <th scope="col">Kit</th>
            <th scope="col">Can it go</th>
            <th scope="col">What it waits for</th>
          </tr>
        </thead>
        <tbody className="block border-ink border-b-2">
          {rows.toReversed().map((row) => (
            <LadderRow
              key={`${row.from}-${row.to}`}
              row={row}
              page={page}
              isTopReady={row.to === topReady}
              hasRuns={rows.length < page.question.quantity}
            />
          ))}
        </tbody>
      </table>
    </section>
  );
}
