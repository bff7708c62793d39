import { data, Form, redirect, useNavigation } from "react-router";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { acceptInvitation } from "~/services/people/links/accept-invitation.server";
import { findLinkOwner } from "~/services/people/links/find-link-owner.server";
import { startSession } from "~/services/people/start-session.server";
import { AppError } from "~/utils/errors";
import { isSecure } from "~/utils/request-is-secure";
import { readSessionId, sessionCookie } from "~/utils/session-cookie";
import type { Route } from "./+types/welcome";
import { Door } from "./door";
import { DoorField } from "./door-field";
import { DoorNotice } from "./door-notice";
import { formFault } from "./form-fault";
import { GoneLink } from "./gone-link";

/** Somebody who has signed in may follow a link as well. */
export const handle = { standsAlone: true };

export const meta: Route.MetaFunction = () => [
  { title: "Welcome · Cotterpin" },
  { name: "referrer", content: "no-referrer" },
];

export const loader = publicLoader(async ({ params }: Route.LoaderArgs) => ({
  owner: await findLinkOwner(params.token, "invitation"),
}));

export const action = publicAction(async ({ request, params, url }: Route.ActionArgs) => {
  try {
    const personId = await acceptInvitation(params.token, Object.fromEntries(await request.formData()));
    const id = await startSession(personId, readSessionId(request.headers), request.headers);
    return redirect("/", { headers: { "Set-Cookie": sessionCookie(id, { secure: isSecure(url) }) } });
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data(fault, init);
  }
});

export default function Welcome({ loaderData, actionData }: Route.ComponentProps) {
  const busy = useNavigation().state === "submitting";
  const { owner } = loaderData;
  if (!owner) return <GoneLink kind="invitation" />;
  return (
    <Door heading={`Welcome, ${owner.name}`}>
      <p className="mt-4 max-w-prose">
        You sign in with <span className="[overflow-wrap:anywhere]">{owner.email}</span>. Choose a password,
        and you are in.
      </p>
      <Form method="post" aria-label="Welcome" className="max-w-md">
        {actionData?.notice && <DoorNotice>{actionData.notice}</DoorNotice>}
        <DoorField
          label="Your name"
          hint="As the others see it."
          name="name"
          autoComplete="name"
          required
          maxLength={120}
          defaultValue={owner.name}
          error={actionData?.fields.name}
        />
        <DoorField
          label="Password"
          hint="At least 12 characters; a short sentence is easy to keep in mind."
          name="password"
          type="password"
          autoComplete="new-password"
          required
          error={actionData?.fields.password}
        />
        <button type="submit" className="button button-main mt-6 w-full sm:w-auto" aria-disabled={busy}>
          {busy ? "Coming in…" : "Set the password and come in"}
        </button>
      </Form>
    </Door>
  );
}
