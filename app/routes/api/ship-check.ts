import { shipCheckQuerySchema } from "~/schemas/planning/ship-check";
import { shipQuestionSchema } from "~/schemas/planning/what-if";
import { apiAction, apiLoader } from "~/services/people/guard.server";
import { answerShipQuestion } from "~/services/planning/answer-ship-question.server";
import { getShipCheck } from "~/services/planning/get-ship-check.server";
import { parseInput, readJson } from "~/utils/request-body";
import type { Route } from "./+types/ship-check";

/** `GET /api/ship-check?kit=S2&quantity=10[&by=DATE][&options=A,B]` */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs, person) => {
  const query = parseInput(shipCheckQuerySchema, Object.fromEntries(url.searchParams));
  return getShipCheck(query, person);
});

/** `POST /api/ship-check`: several demands and a what-if, changing nothing. */
export const action = apiAction("look", async ({ request }: Route.ActionArgs, person) =>
  answerShipQuestion(await readJson(request, shipQuestionSchema), person),
);
