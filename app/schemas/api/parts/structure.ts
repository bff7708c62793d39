import { structureAnswer, whereUsedAnswer } from "~/schemas/api/answers/parts";
import type { ApiRoute } from "~/schemas/api/api-route";
import { structureQuerySchema } from "~/schemas/planning/part-query";

export const structureRoutes: ApiRoute[] = [
  {
    id: "getStructure",
    method: "get",
    path: "/api/structure/:partNumber",
    summary: "The structure of a part as a tree",
    query: structureQuerySchema,
    answer: { type: "application/json", schema: structureAnswer },
    problems: [404, 422],
  },
  {
    id: "getWhereUsed",
    method: "get",
    path: "/api/where-used/:partNumber",
    summary: "The parents that take a part directly",
    answer: { type: "application/json", schema: whereUsedAnswer },
    problems: [404],
  },
];
