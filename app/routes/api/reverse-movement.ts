import { reverseMovementSchema } from "~/schemas/stock/post-movements";
import { apiAction } from "~/services/people/guard.server";
import { reverseAndTell } from "~/services/stock/tell/reverse-and-tell.server";
import { AppError } from "~/utils/errors";
import { readJson } from "~/utils/request-body";
import type { Route } from "./+types/reverse-movement";

function idOf(text: string): number {
  if (/^[1-9]\d{0,14}$/.test(text)) return Number(text);
  throw new AppError("not-found", `There is no movement ${text}.`);
}

/** `POST /api/movements/:id/reverse` */
export const action = apiAction("reverse-movement", async ({ request, params }: Route.ActionArgs, person) => {
  const movementId = idOf(params.id);
  const { reason } = await readJson(request, reverseMovementSchema);
  const key = request.headers.get("Idempotency-Key");
  return Response.json(await reverseAndTell({ person, movementId, reason, key }), { status: 201 });
});
