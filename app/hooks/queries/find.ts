import { keepPreviousData, queryOptions } from "@tanstack/react-query";
import type { FindAnswer } from "~/schemas/find/find-answer";
import { fetchAnswer } from "./fetch-answer";

const HALF_A_MINUTE = 30_000;

/** What is found while one types; nothing is asked before there is something to look for. */
export function findQuery(typed: string) {
  const q = typed.trim();
  return queryOptions({
    queryKey: ["find", q],
    queryFn: ({ signal }) => fetchAnswer<FindAnswer>(`/api/find?q=${encodeURIComponent(q)}`, signal),
    enabled: q.length > 1,
    placeholderData: keepPreviousData,
    staleTime: HALF_A_MINUTE,
    retry: false,
  });
}
