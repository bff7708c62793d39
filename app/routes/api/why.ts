import { readWhyQuery } from "~/schemas/planning/read-why-query";
import { whyQuerySchema } from "~/schemas/planning/why";
import { apiLoader } from "~/services/people/guard.server";
import { getWhy } from "~/services/planning/why/get-why.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/why";

/** `GET /api/why?kit=S2&quantity=10&part=HB-2041[&with=orders][&kits=8]`, or `?through=KO-0154&part=HB-2041`. */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs, person) =>
  getWhy(parseInput(whyQuerySchema, readWhyQuery(url.searchParams)), person),
);
