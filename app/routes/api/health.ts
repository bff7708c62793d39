import { publicLoader } from "~/services/people/guard.server";

export const loader = publicLoader(() => Response.json({ status: "ok" }));
