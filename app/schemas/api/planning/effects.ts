import { effectsAnswer } from "~/schemas/api/answers/effects";
import type { ApiRoute } from "~/schemas/api/api-route";
import { effectsQuestionSchema } from "~/schemas/planning/effects";

export const effectsRoutes: ApiRoute[] = [
  {
    id: "previewEffects",
    method: "post",
    path: "/api/effects",
    summary: "What a change would do to the ship line; changes nothing",
    body: { type: "application/json", schema: effectsQuestionSchema },
    answer: { type: "application/json", schema: effectsAnswer },
    problems: [404],
  },
];
