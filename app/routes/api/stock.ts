import { stockQuerySchema } from "~/schemas/stock/movements-query";
import { apiLoader } from "~/services/people/guard.server";
import { findBalances } from "~/services/stock/ledger/find-balances.server";
import { parseInput } from "~/utils/request-body";
import type { Route } from "./+types/stock";

/** `GET /api/stock[?partNumber=&bin=]` */
export const loader = apiLoader("look", ({ url }: Route.LoaderArgs) =>
  findBalances(parseInput(stockQuerySchema, Object.fromEntries(url.searchParams))),
);
