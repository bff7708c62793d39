import { shipLineAnswer } from "~/schemas/api/answers/ship-line";
import type { ApiRoute } from "~/schemas/api/api-route";

export const shipLineRoutes: ApiRoute[] = [
  {
    id: "getShipLine",
    method: "get",
    path: "/api/ship-line",
    summary: "The open kit orders: ready, of how many, what the next one waits for",
    answer: { type: "application/json", schema: shipLineAnswer },
  },
];
