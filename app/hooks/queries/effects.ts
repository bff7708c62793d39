import { keepPreviousData, queryOptions } from "@tanstack/react-query";
import type { BookChangeInput, EffectsAnswer } from "~/schemas/planning/effects";
import { fetchAnswer } from "./fetch-answer";

const FIVE_SECONDS = 5_000;

/**
 * What a change would do to the ship line; null is not asked. A question that is overtaken is cancelled, and
 * the last answer stays until the next is there.
 */
export function effectsQuery(change: BookChangeInput | null) {
  return queryOptions({
    queryKey: ["effects", change],
    queryFn: ({ signal }) => fetchAnswer<EffectsAnswer>("/api/effects", signal, { change }),
    enabled: change !== null,
    placeholderData: keepPreviousData,
    staleTime: FIVE_SECONDS,
    retry: false,
  });
}
