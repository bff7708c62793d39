import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { readCheckQuery } from "~/schemas/planning/read-check-query";
import { apiLoader } from "~/services/people/guard.server";
import { getCheckAnswer } from "~/services/planning/get-check-answer.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/check-answer";

/** `GET /api/check-answer?kit=S2&quantity=10[&by=DATE][&options=A,B][&if=CHANGE]`: what the page Check shows. */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs, person) => {
  const asked = parseInput(checkQuestionSchema, readCheckQuery(url.searchParams));
  return getCheckAnswer(asked, person);
});
