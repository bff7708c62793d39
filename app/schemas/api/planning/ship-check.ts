import { shipCheckAnswer } from "~/schemas/api/answers/ship-check";
import type { ApiRoute } from "~/schemas/api/api-route";
import { shipCheckQuerySchema } from "~/schemas/planning/ship-check";
import { shipQuestionSchema } from "~/schemas/planning/what-if";

export const shipCheckRoutes: ApiRoute[] = [
  {
    id: "getShipCheck",
    method: "get",
    path: "/api/ship-check",
    summary: "Whether so many kits can ship from the firm's live stock, and what stops the rest",
    query: shipCheckQuerySchema,
    answer: { type: "application/json", schema: shipCheckAnswer },
    problems: [404, 422],
  },
  {
    id: "askShipQuestion",
    method: "post",
    path: "/api/ship-check",
    summary: "The same for several demands, with a what-if; changes nothing",
    body: { type: "application/json", schema: shipQuestionSchema },
    answer: { type: "application/json", schema: shipCheckAnswer },
    problems: [404],
  },
];
