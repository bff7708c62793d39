import { redirect } from "react-router";
import { guardedLoader } from "~/services/people/guard.server";

/** Each person lands on their own verb; until theirs has pages, on Check. */
export const loader = guardedLoader("look", () => redirect("/check"));
