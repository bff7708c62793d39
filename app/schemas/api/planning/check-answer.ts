import { checkPageAnswer } from "~/schemas/api/answers/check-answer";
import type { ApiRoute } from "~/schemas/api/api-route";
import { checkQuestionSchema } from "~/schemas/planning/check-answer";

export const checkAnswerRoutes: ApiRoute[] = [
  {
    id: "getCheckAnswer",
    method: "get",
    path: "/api/check-answer",
    summary: "What the page Check shows: the answer with the parts and kits it speaks of",
    query: checkQuestionSchema,
    answer: { type: "application/json", schema: checkPageAnswer },
    problems: [422],
  },
];
