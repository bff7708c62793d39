import { whyAnswer } from "~/schemas/api/answers/why";
import type { ApiRoute } from "~/schemas/api/api-route";
import { whyQuerySchema } from "~/schemas/planning/why";

export const whyRoutes: ApiRoute[] = [
  {
    id: "getWhy",
    method: "get",
    path: "/api/why",
    summary: "What asks for a part, what covers it and what sets its date",
    query: whyQuerySchema,
    answer: { type: "application/json", schema: whyAnswer },
    problems: [404, 422],
  },
];
