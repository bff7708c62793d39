import { data, Form, Link, useNavigation } from "react-router";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { askNewPassword } from "~/services/people/links/ask-new-password.server";
import { AppError } from "~/utils/errors";
import { requestAddress } from "~/utils/request-address";
import type { Route } from "./+types/forgotten";
import { Door } from "./door";
import { DoorField } from "./door-field";
import { DoorNotice } from "./door-notice";
import { formFault } from "./form-fault";

/** Somebody who has signed in may follow a link as well. */
export const handle = { standsAlone: true };

export const meta: Route.MetaFunction = () => [{ title: "Forgotten your password? · Cotterpin" }];

export const headers: Route.HeadersFunction = ({ actionHeaders }) => actionHeaders;

export const loader = publicLoader(() => null);

export const action = publicAction(async ({ request }: Route.ActionArgs) => {
  try {
    const form = Object.fromEntries(await request.formData());
    await askNewPassword(form, requestAddress(request.headers));
    return { isAsked: true, fault: null };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data({ isAsked: false, fault }, init);
  }
});

export default function Forgotten({ actionData }: Route.ComponentProps) {
  const busy = useNavigation().state === "submitting";
  if (actionData?.isAsked)
    return (
      <Door heading="Look into your mail">
        <p role="status" className="mt-4 max-w-prose">
          If somebody with this address may sign in here, a mail with a link is on its way. The link works
          once, within an hour. If none comes, look for a slip in the address, or ask a manager.
        </p>
        <p className="mt-8">
          <Link to="/sign-in" className="button">
            Back to signing in
          </Link>
        </p>
      </Door>
    );
  return (
    <Door heading="Forgotten your password?">
      <p className="mt-4 max-w-prose">Write your address, and a link for a new one comes by mail.</p>
      <Form method="post" aria-label="Ask for a new password" className="max-w-md">
        {actionData?.fault?.notice && <DoorNotice>{actionData.fault.notice}</DoorNotice>}
        <DoorField
          label="E-mail address"
          name="email"
          type="email"
          autoComplete="username"
          required
          error={actionData?.fault?.fields.email}
        />
        <div className="mt-6 flex flex-wrap items-center gap-4">
          <button type="submit" className="button button-main w-full sm:w-auto" aria-disabled={busy}>
            {busy ? "Asking…" : "Send the link"}
          </button>
          <Link to="/sign-in" className="px-2 py-3 underline">
            Back to signing in
          </Link>
        </div>
      </Form>
    </Door>
  );
}
