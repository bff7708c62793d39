import { z } from "zod";
import { movementsAnswer, postedAnswer, reversedAnswer, stockAnswer } from "~/schemas/api/answers/stock";
import type { ApiRoute } from "~/schemas/api/api-route";
import { movementsQuerySchema, stockQuerySchema } from "~/schemas/stock/movements-query";
import { postMovementsSchema, reverseMovementSchema } from "~/schemas/stock/post-movements";

const key = z.string().regex(/^[!-~]{8,200}$/);

export const movementsRoutes: ApiRoute[] = [
  {
    id: "postMovements",
    method: "post",
    path: "/api/movements",
    summary: "Post movements, all or none; the same key again gives the first answer back",
    headers: z.object({ "Idempotency-Key": key }),
    body: { type: "application/json", schema: postMovementsSchema },
    answer: { type: "application/json", schema: postedAnswer, status: 201 },
    problems: [409],
  },
  {
    id: "findMovements",
    method: "get",
    path: "/api/movements",
    summary: "The ledger in the order in which it was entered, page by page",
    query: movementsQuerySchema,
    answer: { type: "application/json", schema: movementsAnswer },
    problems: [404, 422],
  },
  {
    id: "reverseMovement",
    method: "post",
    path: "/api/movements/:id/reverse",
    summary: "Take a movement back by its opposite, once",
    headers: z.object({ "Idempotency-Key": key.optional() }),
    body: { type: "application/json", schema: reverseMovementSchema },
    answer: { type: "application/json", schema: reversedAnswer, status: 201 },
    problems: [404, 409],
  },
  {
    id: "findBalances",
    method: "get",
    path: "/api/stock",
    summary: "Balances by part, bin, lot and state; those of nothing are left out",
    query: stockQuerySchema,
    answer: { type: "application/json", schema: stockAnswer },
    problems: [404, 422],
  },
];
