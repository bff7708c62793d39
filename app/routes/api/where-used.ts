import { getWhereUsed } from "~/services/parts/get-where-used.server";
import { apiLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/where-used";

/** `GET /api/where-used/:partNumber` */
export const loader = apiLoader("look", ({ params }: Route.LoaderArgs) => getWhereUsed(params.partNumber));
