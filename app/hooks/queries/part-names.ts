import { keepPreviousData, queryOptions } from "@tanstack/react-query";
import { fetchAnswer } from "./fetch-answer";

interface PartName {
  partNumber: string;
  description: string;
}

const A_MINUTE = 60_000;

/** Parts whose number or description has what is typed, for a list under a field. */
export function partNamesQuery(typed: string) {
  return queryOptions({
    queryKey: ["part-names", typed],
    queryFn: async ({ signal }) => {
      const search = new URLSearchParams({ q: typed, size: "12" });
      return (await fetchAnswer<{ parts: PartName[] }>(`/api/parts?${search}`, signal)).parts;
    },
    enabled: typed.length > 1,
    placeholderData: keepPreviousData,
    staleTime: A_MINUTE,
    retry: 0,
  });
}
