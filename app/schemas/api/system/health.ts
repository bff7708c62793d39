import { z } from "zod";
import { count } from "~/schemas/api/answers/values";
import type { ApiRoute } from "~/schemas/api/api-route";

const healthAnswer = z.object({
  status: z.enum(["ok", "draining", "unwell"]),
  database: z.enum(["reachable", "away"]),
  revision: count.nullable(),
  migrations: z.object({ applied: count, pending: z.array(z.string()) }).nullable(),
});

export const healthRoutes: ApiRoute[] = [
  {
    id: "getHealth",
    method: "get",
    path: "/api/health",
    summary: "Whether the database answers, its revision and migrations",
    isPublic: true,
    answer: { type: "application/json", schema: healthAnswer, alsoWith: [503] },
  },
];
