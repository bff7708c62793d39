import { data, Form, Link, redirect, useNavigation } from "react-router";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { finishSignIn } from "~/services/people/second-factor/finish-sign-in.server";
import { AppError } from "~/utils/errors";
import { ownPath } from "~/utils/http-own-path";
import { isSecure } from "~/utils/request-is-secure";
import { clearedHalfCookie, readHalfId, sessionCookie } from "~/utils/session-cookie";
import type { Route } from "./+types/sign-in-code";
import { Door } from "./door";
import { DoorField } from "./door-field";
import { DoorNotice } from "./door-notice";
import { formFault } from "./form-fault";

export const meta: Route.MetaFunction = () => [{ title: "The code · Cotterpin" }];

export const headers: Route.HeadersFunction = ({ actionHeaders }) => actionHeaders;

export const loader = publicLoader(async ({ request, url }: Route.LoaderArgs, findPerson) => {
  if (await findPerson()) throw redirect(ownPath(url.searchParams.get("to")));
  if (!readHalfId(request.headers)) throw redirect("/sign-in");
  return null;
});

export const action = publicAction(async ({ request, url }: Route.ActionArgs) => {
  const secure = isSecure(url);
  try {
    const id = await finishSignIn(request.headers, Object.fromEntries(await request.formData()));
    const headers = new Headers({ "Set-Cookie": sessionCookie(id, { secure }) });
    headers.append("Set-Cookie", clearedHalfCookie({ secure }));
    return redirect(ownPath(url.searchParams.get("to")), { headers });
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data(fault, init);
  }
});

export default function SignInCode({ actionData }: Route.ComponentProps) {
  const busy = useNavigation().state === "submitting";
  return (
    <Door heading="And the code">
      <Form method="post" aria-label="Code" className="mt-4 max-w-md">
        {actionData?.notice && <DoorNotice>{actionData.notice}</DoorNotice>}
        <DoorField
          label="Code"
          hint="The six digits that your authenticator shows now, or one of your recovery codes."
          name="code"
          autoComplete="one-time-code"
          spellCheck={false}
          required
          autoFocus
          maxLength={40}
          error={actionData?.fields.code}
        />
        <button type="submit" className="button button-main mt-6 w-full sm:w-auto" aria-disabled={busy}>
          {busy ? "Signing in…" : "Sign in"}
        </button>
        <p className="mt-6">
          <Link to="/sign-in" className="inline-block py-2 underline">
            Begin again with the password
          </Link>
        </p>
      </Form>
    </Door>
  );
}
