import { partsQuerySchema } from "~/schemas/planning/part-query";
import { findParts } from "~/services/parts/find-parts.server";
import { apiLoader } from "~/services/people/guard.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/parts";

/** `GET /api/parts[?q=&page=&size=]` */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs, person) =>
  findParts(parseInput(partsQuerySchema, Object.fromEntries(url.searchParams)), person),
);
