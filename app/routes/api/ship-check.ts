import { shipCheckQuerySchema } from "~/schemas/planning/ship-check";
import { apiLoader } from "~/services/people/guard.server";
import { getShipCheck } from "~/services/planning/get-ship-check.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/ship-check";

/** `GET /api/ship-check?kit=S2&quantity=10[&by=DATE][&options=A,B]` */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs, person) => {
  const query = parseInput(shipCheckQuerySchema, Object.fromEntries(url.searchParams));
  return getShipCheck(query, person);
});
