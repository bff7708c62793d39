import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { readCheckQuery } from "~/schemas/planning/read-check-query";
import { apiLoader } from "~/services/people/guard.server";
import { getCheckCsv } from "~/services/planning/get-check-csv.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/check-csv";

/** `GET /api/check-csv` with the question of Check: the parts that are missing, as a file. */
export const loader = apiLoader("look", async ({ url }: Route.LoaderArgs, person) => {
  const text = await getCheckCsv(parseInput(checkQuestionSchema, readCheckQuery(url.searchParams)), person);
  return new Response(text, {
    headers: {
      "Content-Type": "text/csv; charset=utf-8",
      "Content-Disposition": 'attachment; filename="ship-check.csv"',
      "Cache-Control": "no-store",
    },
  });
});
