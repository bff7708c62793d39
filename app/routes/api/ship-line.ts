import { apiLoader } from "~/services/people/guard.server";
import { getShipLine } from "~/services/planning/get-ship-line.server";

/** `GET /api/ship-line` */
export const loader = apiLoader("look", () => getShipLine());
