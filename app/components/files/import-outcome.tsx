import { useEffect, useRef } from "react";
import type { ImportPhase, Incoming } from "~/hooks/use-file-import";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { formatNumber } from "~/utils/format/format-number";
import { HeaderMatch } from "./header-match";
import { ImportRows } from "./import-rows";
import { ReportLink } from "./report-link";
import { sayCounts } from "./say-counts";

interface ImportOutcomeProps {
  phase: ImportPhase;
  columns: readonly string[];
  onTry: (file: Incoming) => void;
  onBringIn: (file: Incoming) => void;
}

/** What became of the file so far. */
export function ImportOutcome({ phase, columns, onTry, onBringIn }: ImportOutcomeProps) {
  const box = useRef<HTMLDivElement>(null);
  useEffect(() => {
    if (phase.at === "tried" || phase.at === "done" || phase.at === "refused") box.current?.focus();
  }, [phase.at]);
  if (phase.at === "waiting") return null;
  return (
    <div ref={box} tabIndex={-1} className="mt-6 border-ink border-t-2 pt-4 outline-none">
      {(phase.at === "trying" || phase.at === "writing") && <Progress {...phase} />}
      {phase.at === "refused" && <Refused phase={phase} columns={columns} onTry={onTry} />}
      {phase.at === "tried" && <Tried {...phase} onBringIn={onBringIn} />}
      {phase.at === "done" && <Done {...phase} />}
    </div>
  );
}

function Progress({ at, file, part }: { at: "trying" | "writing"; file: Incoming; part: number }) {
  const isOut = part >= 1;
  const work = at === "trying" ? "Checking every line of" : "Bringing in";
  return (
    <div role="status">
      <p>
        {isOut ? work : "Sending"} <span className="figure">{file.name}</span> …
      </p>
      <progress
        className="mt-2 h-3 w-full max-w-xl"
        max={1}
        value={isOut ? undefined : part}
        aria-label="Progress"
      />
    </div>
  );
}

function Refused({
  phase,
  columns,
  onTry,
}: { phase: Extract<ImportPhase, { at: "refused" }> } & Pick<ImportOutcomeProps, "columns" | "onTry">) {
  const unknown = phase.errors.flatMap(({ unknownHeader, value }) => (unknownHeader && value ? [value] : []));
  return (
    <>
      <p role="alert" className="max-w-prose border-stop border-l-4 bg-stop-wash px-4 py-3">
        {phase.detail}
      </p>
      {phase.errors.length > 0 && (
        <ul className="mt-3 grid max-w-prose gap-1">
          {phase.errors.map((error) => (
            <li key={`${error.line} ${error.column} ${error.message}`}>{error.message}</li>
          ))}
        </ul>
      )}
      {unknown.length > 0 && (
        <HeaderMatch file={phase.file} unknown={unknown} columns={columns} onTry={onTry} />
      )}
    </>
  );
}

function Tried({
  file,
  answer,
  onBringIn,
}: {
  file: Incoming;
  answer: ImportAnswer;
  onBringIn: (file: Incoming) => void;
}) {
  const { counts } = answer;
  const changes = counts.new + counts.changed + counts.removed;
  return (
    <>
      <h3 className="text-lg">{sayCounts(answer)}</h3>
      <p className="mt-1 text-soft">
        <span className="figure">{file.name}</span> was read as {answer.encoding}, with{" "}
        {answer.delimiter === "\t" ? "tabs" : answer.delimiter === ";" ? "semicolons" : "commas"}. Nothing is
        changed yet.
      </p>
      {counts.refused === 0 && changes > 0 && (
        <button type="button" className="button button-main mt-4" onClick={() => onBringIn(file)}>
          Bring in {formatNumber(answer.rows.length)} {answer.rows.length === 1 ? "row" : "rows"}
        </button>
      )}
      {counts.refused > 0 && (
        <p className="mt-3 max-w-prose">
          A file comes in whole or not at all: mend the refused rows in it, and choose it again.
        </p>
      )}
      <ImportRows answer={answer} />
      <ReportLink name={file.name} answer={answer} />
    </>
  );
}

function Done({ file, answer }: { file: Incoming; answer: ImportAnswer }) {
  return (
    <>
      <p role="status" className="max-w-prose border-ink border-l-4 px-4 py-3">
        <span className="figure">{file.name}</span> is in. {sayCounts(answer)}
      </p>
      <ReportLink name={file.name} answer={answer} />
    </>
  );
}
