import { publicLoader } from "~/services/people/guard.server";
import { getHealth } from "~/services/system/get-health.server";

export const loader = publicLoader(async () => {
  const health = await getHealth();
  return Response.json(health, { status: health.status === "ok" ? 200 : 503 });
});
