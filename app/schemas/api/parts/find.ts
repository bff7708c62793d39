import { z } from "zod";
import { count } from "~/schemas/api/answers/values";
import type { ApiRoute } from "~/schemas/api/api-route";
import { type FindAnswer, FOUND_KINDS } from "~/schemas/find/find-answer";
import { findQuerySchema } from "~/schemas/find/find-query";

const found = z.object({ name: z.string(), words: z.string(), to: z.string() });

const findAnswer = z.object({
  q: z.string(),
  exact: z.string().nullable(),
  groups: z.array(z.object({ kind: z.enum(FOUND_KINDS), found: z.array(found), more: count })),
}) satisfies z.ZodType<FindAnswer>;

export const findRoutes: ApiRoute[] = [
  {
    id: "searchEverything",
    method: "get",
    path: "/api/find",
    summary: "Parts, bins, lots, suppliers and orders by a piece of the number or by words",
    query: findQuerySchema,
    answer: { type: "application/json", schema: findAnswer },
    problems: [422],
  },
];
