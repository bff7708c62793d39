import { checkPageAnswer } from "~/schemas/api/answers/check-answer";
import type { ApiRoute } from "~/schemas/api/api-route";
import { checkAddress } from "./with-ifs";

export const checkAnswerRoutes: ApiRoute[] = [
  {
    id: "getCheckAnswer",
    method: "get",
    path: "/api/check-answer",
    summary: "What the page Check shows: the answer with the parts and kits it speaks of",
    query: checkAddress,
    answer: { type: "application/json", schema: checkPageAnswer },
    problems: [422],
  },
  {
    id: "getCheckCsv",
    method: "get",
    path: "/api/check-csv",
    summary: "The parts that are missing as CSV, worst first",
    query: checkAddress,
    answer: { type: "text/csv" },
    problems: [422],
  },
];
