import { effectsQuestionSchema } from "~/schemas/planning/effects";
import { apiAction } from "~/services/people/guard.server";
import { previewEffects } from "~/services/planning/effects/preview-effects.server";
import { readJson } from "~/utils/request-body";
import type { Route } from "./+types/effects";

/** `POST /api/effects`: what a change would do to the ship line, changing nothing. */
export const action = apiAction("look", async ({ request }: Route.ActionArgs) => {
  const { change } = await readJson(request, effectsQuestionSchema);
  return previewEffects(change);
});
