import { queryOptions } from "@tanstack/react-query";
import type { ShipLineAnswer } from "~/schemas/planning/ship-line";
import { fetchAnswer } from "./fetch-answer";

const HALF_A_MINUTE = 30_000;

/** The state of the open kit orders, asked again every half minute, on focus and after each act. */
export function shipLineQuery() {
  return queryOptions({
    queryKey: ["ship-line"],
    queryFn: ({ signal }) => fetchAnswer<ShipLineAnswer>("/api/ship-line", signal),
    refetchInterval: HALF_A_MINUTE,
    staleTime: 5_000,
    retry: 1,
  });
}
