import { useCheckAnswer } from "~/hooks/use-check-answer";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { AnswerSentence } from "./answer-sentence";
import { Cautions } from "./cautions";
import { DateChain } from "./date-chain";
import { EmptyBook } from "./empty-book";
import { Ladder } from "./ladder";
import { QuestionSentence } from "./question-sentence";
import { StoppersTable } from "./stoppers-table";
import { Warnings } from "./warnings";
import { WhatIfs } from "./what-ifs";

/** Check: a question to fill in, its answer in a sentence, and under it the picture and the reasons. */
export function CheckPage({ first }: { first: CheckPageAnswer }) {
  const { question, page, isBehind, error, ask } = useCheckAnswer(first);
  if (page.kits.length === 0) return <EmptyBook />;
  return (
    <>
      <h1 className="sr-only">Check what can ship</h1>
      <QuestionSentence question={question} kits={page.kits} today={page.answer?.today} onAsk={ask} />
      <div aria-busy={isBehind} className={isBehind ? "opacity-60 transition-opacity delay-300" : ""}>
        <AnswerSentence page={page} />
        {error !== null && (
          <p role="alert" className="mt-3 max-w-prose border-stop border-l-4 pl-3">
            {error.message} What is shown is the answer before it.
          </p>
        )}
        <WhatIfs question={question} page={page} onAsk={ask} />
        {page.answer !== null && <Reasons page={page} />}
      </div>
    </>
  );
}

function Reasons({ page }: { page: CheckPageAnswer }) {
  return (
    <>
      <div className="mt-8 grid items-start gap-x-10 gap-y-8 desk:grid-cols-[minmax(25rem,5fr)_minmax(0,9fr)]">
        <Ladder page={page} />
        <div className="grid min-w-0 gap-4">
          <StoppersTable page={page} />
          <DateChain page={page} />
          <Warnings warnings={page.answer?.warnings ?? []} />
        </div>
      </div>
      <div className="mt-8">
        <Cautions />
      </div>
    </>
  );
}
