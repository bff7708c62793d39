import { useQuery } from "@tanstack/react-query";
import { useNavigate, useSearchParams } from "react-router";
import { checkSearch } from "~/components/check/check-search";
import { readQuestion } from "~/components/check/read-question";
import type { CheckPageAnswer, CheckQuestion } from "~/schemas/planning/check-answer";
import { checkAnswerQuery } from "./queries/check-answer";

/**
 * The question in the address and its answer. The first answer is the loader's; a changed question is put in
 * the address in place of the last one and answered while the last answer stays.
 */
export function useCheckAnswer(first: CheckPageAnswer) {
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const question = readQuestion(search, first.question);
  const isFirst = checkSearch(question) === checkSearch(first.question);
  const query = useQuery({ ...checkAnswerQuery(question), initialData: isFirst ? first : undefined });

  return {
    question,
    page: query.data ?? first,
    /** The answer shown belongs to an earlier question. */
    isBehind: query.isPlaceholderData || (query.data === undefined && query.isPending),
    error: query.error,
    ask(next: CheckQuestion) {
      void navigate(`?${checkSearch(next)}`, { replace: true, preventScrollReset: true });
    },
  };
}
