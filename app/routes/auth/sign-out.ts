import { redirect } from "react-router";
import { publicAction } from "~/services/people/guard.server";

export const action = publicAction(() => redirect("/sign-in"));
