import { data, Form, redirect, useNavigation } from "react-router";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { hasManager } from "~/services/people/has-manager.server";
import { setUpManager } from "~/services/people/set-up-manager.server";
import { startSession } from "~/services/people/start-session.server";
import { AppError } from "~/utils/errors";
import { requestAddress } from "~/utils/request-address";
import { isSecure } from "~/utils/request-is-secure";
import { readSessionId, sessionCookie } from "~/utils/session-cookie";
import type { Route } from "./+types/set-up";
import { Door } from "./door";
import { DoorField } from "./door-field";
import { DoorNotice } from "./door-notice";
import { formFault } from "./form-fault";

export const meta: Route.MetaFunction = () => [{ title: "Set up the shop · Cotterpin" }];

export const headers: Route.HeadersFunction = ({ actionHeaders }) => actionHeaders;

export const loader = publicLoader(async () => {
  if (await hasManager()) throw redirect("/");
  return null;
});

export const action = publicAction(async ({ request, url }: Route.ActionArgs) => {
  try {
    const form = Object.fromEntries(await request.formData());
    const personId = await setUpManager(form, requestAddress(request.headers));
    const id = await startSession(personId, readSessionId(request.headers), request.headers);
    return redirect("/", { headers: { "Set-Cookie": sessionCookie(id, { secure: isSecure(url) }) } });
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data(fault, init);
  }
});

export default function SetUp({ actionData }: Route.ComponentProps) {
  const busy = useNavigation().state === "submitting";
  const fields = actionData?.fields ?? {};
  return (
    <Door heading="Set up the shop">
      <p className="mt-4 max-w-prose">
        Nobody is here yet. Whoever has the code that the start command printed becomes the manager, and can
        let the others in.
      </p>
      <Form method="post" aria-label="Set up the shop" className="max-w-md">
        {actionData?.notice && <DoorNotice>{actionData.notice}</DoorNotice>}
        <DoorField
          label="Code"
          hint="Four groups of four; small letters will do."
          name="code"
          autoComplete="one-time-code"
          spellCheck={false}
          required
          error={fields.code}
        />
        <DoorField
          label="Your name"
          name="name"
          autoComplete="name"
          required
          maxLength={120}
          error={fields.name}
        />
        <DoorField
          label="E-mail address"
          name="email"
          type="email"
          autoComplete="username"
          required
          error={fields.email}
        />
        <DoorField
          label="Password"
          hint="At least 12 characters; a short sentence is easy to keep in mind."
          name="password"
          type="password"
          autoComplete="new-password"
          required
          error={fields.password}
        />
        <button type="submit" className="button button-main mt-6 w-full sm:w-auto" aria-disabled={busy}>
          {busy ? "Setting up…" : "Set up and sign in"}
        </button>
      </Form>
    </Door>
  );
}
