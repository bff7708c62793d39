import type { ApiRoute } from "./api-route";
import { exportsRoutes } from "./files/exports";
import { importsRoutes } from "./files/imports";
import { findRoutes } from "./parts/find";
import { partsRoutes } from "./parts/parts";
import { structureRoutes } from "./parts/structure";
import { checkAnswerRoutes } from "./planning/check-answer";
import { effectsRoutes } from "./planning/effects";
import { shipCheckRoutes } from "./planning/ship-check";
import { shipLineRoutes } from "./planning/ship-line";
import { whyRoutes } from "./planning/why";
import { movementsRoutes } from "./stock/movements";
import { healthRoutes } from "./system/health";
import { openapiRoutes } from "./system/openapi";

/** Every JSON route, as `GET /api/openapi.json` lists them; a test holds them against `app/routes.ts`. */
export const ALL_API_ROUTES: readonly ApiRoute[] = [
  ...shipCheckRoutes,
  ...shipLineRoutes,
  ...effectsRoutes,
  ...checkAnswerRoutes,
  ...whyRoutes,
  ...findRoutes,
  ...partsRoutes,
  ...structureRoutes,
  ...movementsRoutes,
  ...importsRoutes,
  ...exportsRoutes,
  ...healthRoutes,
  ...openapiRoutes,
];
