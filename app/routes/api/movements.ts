import { movementsQuerySchema } from "~/schemas/stock/movements-query";
import { postMovementsSchema } from "~/schemas/stock/post-movements";
import { assertKey } from "~/services/idempotency/assert-key";
import { apiAction, apiLoader } from "~/services/people/guard.server";
import { findMovements } from "~/services/stock/ledger/find-movements.server";
import { postAndTell } from "~/services/stock/tell/post-and-tell.server";
import { readJsonLines } from "~/utils/read-json-lines";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/movements";

/** `GET /api/movements[?partNumber=&after=]` */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs) =>
  findMovements(parseInput(movementsQuerySchema, Object.fromEntries(url.searchParams))),
);

/** `POST /api/movements` with `Idempotency-Key`; the service asks the right of each kind. */
export const action = apiAction("look", async ({ request }: Route.ActionArgs, person) => {
  const key = assertKey(request.headers.get("Idempotency-Key"));
  const sentence = "Some movements cannot be posted; nothing was changed.";
  const { movements } = await readJsonLines(request, postMovementsSchema, sentence);
  return Response.json(await postAndTell({ person, key, movements }), { status: 201 });
});
