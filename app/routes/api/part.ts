import { getPart } from "~/services/parts/get-part.server";
import { apiLoader } from "~/services/people/guard.server";
import type { Route } from "./+types/part";

/** `GET /api/parts/:partNumber` */
export const loader = apiLoader("look", ({ params }: Route.LoaderArgs, person) =>
  getPart(params.partNumber, person),
);
