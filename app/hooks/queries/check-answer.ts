import { keepPreviousData, queryOptions } from "@tanstack/react-query";
import { checkSearch } from "~/components/check/check-search";
import type { CheckPageAnswer, CheckQuestion } from "~/schemas/planning/check-answer";
import { fetchAnswer } from "./fetch-answer";

const TEN_SECONDS = 10_000;

/** The answer to a question of Check. The last answer stays on the page until the next is there. */
export function checkAnswerQuery(question: CheckQuestion) {
  const search = checkSearch(question);
  return queryOptions({
    queryKey: ["check-answer", search],
    queryFn: ({ signal }) => fetchAnswer<CheckPageAnswer>(`/api/check-answer?${search}`, signal),
    placeholderData: keepPreviousData,
    staleTime: TEN_SECONDS,
    retry: 1,
  });
}
