import { redirect } from "react-router";
import { guardedLoader } from "~/services/people/guard.server";

/** Pack lands on its first page. */
export const loader = guardedLoader("look", () => redirect("/pack/kit-orders"));
