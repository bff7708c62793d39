import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { answerWords } from "./answer-words";

/** The answer in words, read out anew when it changes. */
export function AnswerSentence({ page }: { page: CheckPageAnswer }) {
  return (
    <p
      role="status"
      className="mt-3 min-h-[1.4em] max-w-[62rem] text-pretty text-xl leading-snug sm:text-[1.75rem]"
    >
      {page.problem ??
        answerWords(page).map((word, place) => (
          <span
            // biome-ignore lint/suspicious/noArrayIndexKey: words have no other identity than their place.
            key={place}
            className={`${word.stops ? "font-bold text-stop" : ""} ${word.figure ? "figure whitespace-nowrap text-[0.92em] font-semibold" : ""}`}
          >
            {word.text}
          </span>
        ))}
    </p>
  );
}
