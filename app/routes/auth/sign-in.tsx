import { data, Form, Link, redirect, useNavigation } from "react-router";
import { getSignInPage } from "~/services/people/get-sign-in-page.server";
import { publicAction, publicLoader } from "~/services/people/guard.server";
import { signIn } from "~/services/people/sign-in.server";
import { AppError } from "~/utils/errors";
import { ownPath } from "~/utils/http-own-path";
import { isSecure } from "~/utils/request-is-secure";
import { halfCookie, sessionCookie } from "~/utils/session-cookie";
import type { Route } from "./+types/sign-in";
import { DemoChoices } from "./demo-choices";
import { Door } from "./door";
import { DoorField } from "./door-field";
import { DoorNotice } from "./door-notice";
import { formFault } from "./form-fault";

export const meta: Route.MetaFunction = () => [{ title: "Sign in · Cotterpin" }];

export const headers: Route.HeadersFunction = ({ actionHeaders }) => actionHeaders;

export const loader = publicLoader(async ({ url }: Route.LoaderArgs, findPerson) => {
  if (await findPerson()) throw redirect(ownPath(url.searchParams.get("to")));
  const page = await getSignInPage();
  if (page.needsSetUp) throw redirect("/set-up");
  return { demo: page.demo, hasNewPassword: url.searchParams.get("done") === "new-password" };
});

export const action = publicAction(async ({ request, url }: Route.ActionArgs) => {
  try {
    const { id, isHalf } = await signIn(request);
    const secure = { secure: isSecure(url) };
    const cookie = isHalf ? halfCookie(id, secure) : sessionCookie(id, secure);
    const to = isHalf ? `/sign-in/code${url.search}` : ownPath(url.searchParams.get("to"));
    return redirect(to, { headers: { "Set-Cookie": cookie } });
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data(fault, init);
  }
});

export default function SignIn({ loaderData, actionData }: Route.ComponentProps) {
  const busy = useNavigation().state === "submitting";
  const { demo, hasNewPassword } = loaderData;
  return (
    <Door heading={demo.length > 0 ? "Which kits can ship, and what stops the rest?" : "Sign in"}>
      <div className={demo.length > 0 ? "mt-8 grid items-start gap-8 md:grid-cols-2" : "mt-4 max-w-md"}>
        {demo.length > 0 && <DemoChoices people={demo} />}
        <Form method="post" aria-label="Sign in" className={demo.length > 0 ? "md:pt-6" : ""}>
          {demo.length > 0 && <h2 className="text-lg font-bold">Or sign in with a password</h2>}
          {hasNewPassword && !actionData && (
            <p role="status" className="mt-5 border-ink border-l-4 bg-sheet px-4 py-3">
              Your new password is set, and every session under the old one has ended. Sign in with it.
            </p>
          )}
          {actionData?.notice && <DoorNotice>{actionData.notice}</DoorNotice>}
          <DoorField
            label="E-mail address"
            name="email"
            type="email"
            autoComplete="username"
            required
            error={actionData?.fields.email}
          />
          <DoorField
            label="Password"
            name="password"
            type="password"
            autoComplete="current-password"
            required
            error={actionData?.fields.password}
          />
          <div className="mt-6 flex flex-wrap items-center gap-x-4 gap-y-2">
            <button type="submit" className="button button-main w-full sm:w-auto" aria-disabled={busy}>
              {busy ? "Signing in…" : "Sign in"}
            </button>
            <Link to="/forgotten" className="py-3 underline sm:px-2">
              Forgotten your password?
            </Link>
          </div>
        </Form>
      </div>
    </Door>
  );
}
