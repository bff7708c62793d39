import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { checkSearch } from "~/components/check/check-search";
import type { CheckPageAnswer } from "~/schemas/planning/check-answer";
import { checkAnswerQuery } from "./queries/check-answer";
import { useCheckQuestion } from "./use-check-question";

/** The question of Check and its answer: the first is the loader's, and each stays until the next is there. */
export function useCheckAnswer(first: CheckPageAnswer) {
  const { question, ask } = useCheckQuestion(first.question);
  const isFirst = checkSearch(question) === checkSearch(first.question);
  const query = useQuery({ ...checkAnswerQuery(question), initialData: isFirst ? first : undefined });

  // A failed question has no answer of its own: the one before it is kept for it.
  const [last, setLast] = useState(first);
  if (query.data !== undefined && query.data !== last) setLast(query.data);

  return {
    question,
    ask,
    page: query.data ?? last,
    /** The answer shown belongs to an earlier question. */
    isBehind: query.isPlaceholderData || (query.data === undefined && query.isPending),
    error: query.error,
  };
}
