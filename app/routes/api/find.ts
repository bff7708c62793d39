import { findQuerySchema } from "~/schemas/find/find-query";
import { searchEverything } from "~/services/find/search-everything.server";
import { apiLoader } from "~/services/people/guard.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/find";

/** `GET /api/find?q=` */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs) =>
  searchEverything(parseInput(findQuerySchema, Object.fromEntries(url.searchParams)).q),
);
