import { useState } from "react";
import type { ImportAnswer, ImportLine, ImportResult } from "~/schemas/imports/import-answer";
import { formatNumber } from "~/utils/format/format-number";
import { differences } from "./differences";

const STEP = 100;
const ORDER: readonly ImportResult[] = ["refused", "changed", "new", "same"];
const WORDS: Record<ImportResult, string> = {
  refused: "refused",
  changed: "changed",
  new: "new",
  same: "unchanged",
};
const SHAPES: Record<ImportResult, string> = { refused: "▲", changed: "◆", new: "＋", same: "·" };

/** The rows of a file, what is wrong first, with what each changes. */
export function ImportRows({ answer }: { answer: ImportAnswer }) {
  const present = ORDER.filter((result) => answer.counts[result] > 0);
  const [chosen, setChosen] = useState<ImportResult | null>(null);
  const [most, setMost] = useState(STEP);
  const shown = chosen !== null && present.includes(chosen) ? chosen : present[0];
  if (shown === undefined) return null;
  const rows = answer.rows.filter(({ result }) => result === shown);
  return (
    <div className="mt-4">
      <fieldset className="flex flex-wrap gap-x-6 gap-y-1">
        <legend className="sr-only">Which rows to show</legend>
        {present.map((result) => (
          <label key={result} className="flex min-h-11 items-center gap-2">
            <input
              type="radio"
              name="import-rows"
              checked={result === shown}
              onChange={() => {
                setChosen(result);
                setMost(STEP);
              }}
            />
            {formatNumber(answer.counts[result])} {WORDS[result]}
          </label>
        ))}
      </fieldset>
      <ol className="mt-2">
        {rows.slice(0, most).map((row) => (
          <Line key={row.line} row={row} />
        ))}
      </ol>
      {rows.length > most && (
        <button type="button" className="mt-2 py-2 underline" onClick={() => setMost(most + STEP)}>
          Show {formatNumber(Math.min(STEP, rows.length - most))} more of {formatNumber(rows.length - most)}
        </button>
      )}
      {shown === present[0] && answer.removed.length > 0 && (
        <p className="mt-2 text-soft">
          {formatNumber(answer.removed.length)} structure lines go, since the file does not have them.
        </p>
      )}
    </div>
  );
}

function Line({ row }: { row: ImportLine }) {
  return (
    <li className="grid gap-x-4 border-line border-t py-2 sm:grid-cols-[7rem_minmax(0,1fr)]">
      <span>
        <span aria-hidden="true" className={row.result === "refused" ? "text-stop" : "text-soft"}>
          {SHAPES[row.result]}
        </span>{" "}
        line <span className="figure">{row.line}</span>
      </span>
      <div className="min-w-0 break-words">
        {row.errors.map(({ message }) => (
          <p key={message}>{message}</p>
        ))}
        {row.errors.length === 0 && <Changes row={row} />}
        {row.notes.map((note) => (
          <p key={note} className="text-soft">
            {note}
          </p>
        ))}
      </div>
    </li>
  );
}

function Changes({ row }: { row: ImportLine }) {
  const { name, changes } = differences(row);
  return (
    <p>
      <span className="figure font-semibold">{name}</span>
      {changes.map(({ field, before, after }) => (
        <span key={field}>
          {" · "}
          {field} {before !== null && <span className="figure text-soft line-through">{before}</span>}{" "}
          <span className="figure">{after}</span>
        </span>
      ))}
    </p>
  );
}
