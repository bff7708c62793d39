import { makeOpenapi } from "~/services/api/make-openapi";
import { apiLoader } from "~/services/people/guard.server";

/** `GET /api/openapi.json`: what the JSON routes take and answer, as OpenAPI 3.1. */
export const loader = apiLoader("look", () => makeOpenapi());
