import { structureQuerySchema } from "~/schemas/planning/part-query";
import { getStructure } from "~/services/parts/get-structure.server";
import { apiLoader } from "~/services/people/guard.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/structure";

/** `GET /api/structure/:partNumber?levels=` */
export const loader = apiLoader("look", ({ params, url }: Route.LoaderArgs) => {
  const { levels } = parseInput(structureQuerySchema, Object.fromEntries(url.searchParams));
  return getStructure(params.partNumber, levels);
});
