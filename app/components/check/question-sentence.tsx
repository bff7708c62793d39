import { Form } from "react-router";
import type { CheckKit, CheckQuestion } from "~/schemas/planning/check-answer";
import { DateBlank } from "./date-blank";
import { KitBlank } from "./kit-blank";
import { NumberBlank } from "./number-blank";
import { OptionsBlank } from "./options-blank";

interface QuestionSentenceProps {
  question: CheckQuestion;
  kits: CheckKit[];
  today: string | undefined;
  onAsk: (question: CheckQuestion) => void;
}

/** The question as a sentence with blanks. A plain form underneath, so that it also works before the script is there. */
export function QuestionSentence({ question, kits, today, onAsk }: QuestionSentenceProps) {
  const kit = kits.find((one) => one.partNumber === question.kit);
  const options = kit?.options ?? [];
  return (
    <Form
      method="get"
      noValidate
      aria-label="The question"
      onSubmit={(event) => event.preventDefault()}
      className="flex flex-wrap items-center gap-x-[0.35em] gap-y-2 text-2xl leading-[1.5] sm:text-[2rem] print:text-2xl"
    >
      <span>Can we ship</span>
      <NumberBlank quantity={question.quantity} onChange={(quantity) => onAsk({ ...question, quantity })} />
      <span>of</span>
      <KitBlank
        kits={kits}
        kit={question.kit}
        onChange={(chosen) => onAsk({ ...question, kit: chosen, options: [] })}
      />
      <span className="flex flex-wrap items-center gap-x-[0.35em]">
        <span>by</span>
        <DateBlank by={question.by} today={today} onChange={(by) => onAsk({ ...question, by })} />
        {options.length === 0 && <span className="-ml-[0.3em]">?</span>}
      </span>
      {options.length > 0 && (
        <span className="flex flex-wrap items-center gap-x-[0.35em]">
          <span>with</span>
          <OptionsBlank
            options={options}
            chosen={question.options}
            onChange={(codes) => onAsk({ ...question, options: codes })}
          />
          <span className="-ml-[0.3em]">?</span>
        </span>
      )}
      <noscript>
        <button type="submit" className="button text-base">
          Ask
        </button>
      </noscript>
    </Form>
  );
}
