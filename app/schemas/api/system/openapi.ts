import { z } from "zod";
import type { ApiRoute } from "~/schemas/api/api-route";

export const openapiRoutes: ApiRoute[] = [
  {
    id: "getOpenapi",
    method: "get",
    path: "/api/openapi.json",
    summary: "This document",
    answer: {
      type: "application/json",
      schema: z.looseObject({ openapi: z.literal("3.1.0") }),
    },
  },
];
