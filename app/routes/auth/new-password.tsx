import { data, Form, redirect, useNavigation } from "react-router";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { findLinkOwner } from "~/services/people/links/find-link-owner.server";
import { setNewPassword } from "~/services/people/links/set-new-password.server";
import { AppError } from "~/utils/errors";
import { isSecure } from "~/utils/request-is-secure";
import { clearedSessionCookie } from "~/utils/session-cookie";
import type { Route } from "./+types/new-password";
import { Door } from "./door";
import { DoorField } from "./door-field";
import { DoorNotice } from "./door-notice";
import { formFault } from "./form-fault";
import { GoneLink } from "./gone-link";

/** Somebody who has signed in may follow a link as well. */
export const handle = { standsAlone: true };

export const meta: Route.MetaFunction = () => [
  { title: "A new password · Cotterpin" },
  { name: "referrer", content: "no-referrer" },
];

export const loader = publicLoader(async ({ params }: Route.LoaderArgs) => ({
  owner: await findLinkOwner(params.token, "password"),
}));

export const action = publicAction(async ({ request, params, url }: Route.ActionArgs) => {
  try {
    await setNewPassword(params.token, Object.fromEntries(await request.formData()));
    const cookie = clearedSessionCookie({ secure: isSecure(url) });
    return redirect("/sign-in?done=new-password", { headers: { "Set-Cookie": cookie } });
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data(fault, init);
  }
});

export default function NewPassword({ loaderData, actionData }: Route.ComponentProps) {
  const busy = useNavigation().state === "submitting";
  if (!loaderData.owner) return <GoneLink kind="password" />;
  return (
    <Door heading="A new password">
      <p className="mt-4 max-w-prose">
        For <span className="[overflow-wrap:anywhere]">{loaderData.owner.email}</span>. Wherever this person
        is signed in now, that ends; sign in again with the new password.
      </p>
      <Form method="post" aria-label="A new password" className="max-w-md">
        {actionData?.notice && <DoorNotice>{actionData.notice}</DoorNotice>}
        <DoorField
          label="New password"
          hint="At least 12 characters; a short sentence is easy to keep in mind."
          name="password"
          type="password"
          autoComplete="new-password"
          required
          error={actionData?.fields.password}
        />
        <button type="submit" className="button button-main mt-6 w-full sm:w-auto" aria-disabled={busy}>
          {busy ? "Setting…" : "Set the new password"}
        </button>
      </Form>
    </Door>
  );
}
