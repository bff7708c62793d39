import { redirect } from "react-router";
import { endSession } from "~/services/people/end-session.server";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { isSecure } from "~/utils/request-is-secure";
import { clearedSessionCookie, readSessionId } from "~/utils/session-cookie";
import type { Route } from "./+types/sign-out";

/** Somebody who typed the address: signing out is a button's work. */
export const loader = publicLoader(() => redirect("/"));

export const action = publicAction(async ({ request, url }: Route.ActionArgs) => {
  const id = readSessionId(request.headers);
  if (id) await endSession(id);
  return redirect("/sign-in", { headers: { "Set-Cookie": clearedSessionCookie({ secure: isSecure(url) }) } });
});
