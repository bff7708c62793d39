import { lazy, Suspense, useState } from "react";
import type { CheckPageAnswer, CheckQuestion } from "~/schemas/planning/check-answer";
import { checkSearch } from "./check-search";
import { CopyLink } from "./copy-link";
import { differenceWords } from "./difference-words";
import { ifWords } from "./if-words";

const Tray = lazy(() => import("./tray/what-if-tray").then(({ WhatIfTray }) => ({ default: WhatIfTray })));

interface WhatIfsProps {
  question: CheckQuestion;
  page: CheckPageAnswer;
  onAsk: (question: CheckQuestion) => void;
}

/** The changes that are tried on the answer, and the tray to add one; beside them what to do with the answer. */
export function WhatIfs({ question, page, onAsk }: WhatIfsProps) {
  const [isOpen, setIsOpen] = useState(false);
  const { ifs } = question;
  const setIfs = (next: string[]) => onAsk({ ...question, ifs: next });
  return (
    <section aria-label="What if" className="mt-4">
      {ifs.length > 0 && <Tried page={page} ifs={ifs} onChange={setIfs} />}
      <div className="flex flex-wrap items-center gap-x-6 print:hidden">
        <button
          type="button"
          aria-expanded={isOpen}
          className="min-h-11 font-bold underline"
          onClick={() => setIsOpen(!isOpen)}
        >
          {isOpen ? "Close what if" : "What if …"}
        </button>
        {ifs.length > 0 && (
          <>
            <CopyLink />
            <button type="button" className="min-h-11 underline" onClick={() => setIfs([])}>
              Without them
            </button>
          </>
        )}
        {page.answer !== null && (
          <>
            <a
              href={`/api/check-csv?${checkSearch(question)}`}
              download
              className="flex min-h-11 items-center underline"
            >
              Download as CSV
            </a>
            <button type="button" className="min-h-11 underline" onClick={() => window.print()}>
              Print
            </button>
          </>
        )}
      </div>
      {isOpen && (
        <Suspense fallback={<p className="py-4 text-soft">Opening …</p>}>
          <Tray seesCosts={page.seesCosts} onAdd={(text) => setIfs([...ifs, text])} />
        </Suspense>
      )}
    </section>
  );
}

function Tried({
  page,
  ifs,
  onChange,
}: {
  page: CheckPageAnswer;
  ifs: string[];
  onChange: (ifs: string[]) => void;
}) {
  const today = page.answer?.today;
  const problems = new Map(page.ifs.map(({ text, problem }) => [text, problem]));
  return (
    <div className="mb-2 max-w-[62rem] border-ink border-l-4 border-dashed pl-4">
      <p role="status" className="text-lg">
        <strong>What if, nothing stored.</strong> {differenceWords(page)}
      </p>
      <ul className="mt-2 flex flex-wrap gap-2">
        {ifs.map((text, place) => (
          // biome-ignore lint/suspicious/noArrayIndexKey: the same change may be tried twice
          <li key={`${place} ${text}`} className="max-w-full border border-edge bg-sheet">
            <span className="flex items-center">
              <span className="min-w-0 break-words py-1 pl-3">{ifWords(text, today)}</span>
              <button
                type="button"
                aria-label={`Take away: ${ifWords(text, today)}`}
                className="min-h-11 min-w-11 shrink-0 text-xl print:hidden"
                onClick={() => onChange(ifs.filter((_, at) => at !== place))}
              >
                ×
              </button>
            </span>
            {problems.get(text) && (
              <span role="alert" className="block border-stop border-t-2 px-3 py-1">
                Not tried: {problems.get(text)}
              </span>
            )}
          </li>
        ))}
      </ul>
    </div>
  );
}
