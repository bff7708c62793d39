import { whyAnswer } from "~/schemas/api/answers/why";
import type { ApiRoute } from "~/schemas/api/api-route";
import { whyAddressQuery } from "./with-ifs";

export const whyRoutes: ApiRoute[] = [
  {
    id: "getWhy",
    method: "get",
    path: "/api/why",
    summary: "What asks for a part, what covers it and what sets its date",
    query: whyAddressQuery,
    answer: { type: "application/json", schema: whyAnswer },
    problems: [404, 422],
  },
];
