import { checkQuestionSchema } from "~/schemas/planning/check-answer";
import { apiLoader } from "~/services/people/guard.server";
import { getCheckCsv } from "~/services/planning/get-check-csv.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/check-csv";

/** `GET /api/check-csv` with the question of Check: the parts that are missing, as a file. */
export const loader = apiLoader("look", async ({ url }: Route.LoaderArgs, person) => {
  const search = { ...Object.fromEntries(url.searchParams), ifs: url.searchParams.getAll("if") };
  const text = await getCheckCsv(parseInput(checkQuestionSchema, search), person);
  return new Response(text, {
    headers: {
      "Content-Type": "text/csv; charset=utf-8",
      "Content-Disposition": 'attachment; filename="ship-check.csv"',
      "Cache-Control": "no-store",
    },
  });
});
