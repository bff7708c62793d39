import { partAnswer, partsAnswer } from "~/schemas/api/answers/parts";
import type { ApiRoute } from "~/schemas/api/api-route";
import { partsQuerySchema } from "~/schemas/planning/part-query";

export const partsRoutes: ApiRoute[] = [
  {
    id: "findParts",
    method: "get",
    path: "/api/parts",
    summary: "Parts in the order of their numbers, page by page",
    query: partsQuerySchema,
    answer: { type: "application/json", schema: partsAnswer },
    problems: [422],
  },
  {
    id: "getPart",
    method: "get",
    path: "/api/parts/:partNumber",
    summary: "One part with balances, what is promised and on order, and where it is used",
    answer: { type: "application/json", schema: partAnswer },
    problems: [404],
  },
];
