import { data, redirect } from "react-router";
import { OwnTokens } from "~/components/account/own-tokens";
import { PasswordForm } from "~/components/account/password-form";
import { SecondFactor } from "~/components/account/second-factor";
import { SessionList } from "~/components/admin/session-list";
import { Notice } from "~/components/ui/notice";
import { Saved } from "~/components/ui/saved";
import { getAccount } from "~/services/people/account/get-account.server";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import { requestAddress } from "~/utils/request-address";
import { readSessionId } from "~/utils/session-cookie";
import type { Route } from "./+types/account";
import { formFault } from "./form-fault";
import { runAccountAct } from "./run-account-act";

export const meta: Route.MetaFunction = () => [{ title: "Your account · Cotterpin" }];

const DONE: Record<string, string> = {
  password: "Your password is changed. Every other session of yours has ended.",
  "end-session": "The session has ended.",
  "end-others": "Every other session of yours has ended.",
  "begin-factor": "Now let your authenticator read the picture, and type the code it shows.",
  "end-factor": "The second factor is off.",
  "end-token": "The token is withdrawn.",
};

export const loader = guardedLoader("own-account", async ({ request, url }: Route.LoaderArgs, person) => ({
  ...(await getAccount(person, readSessionId(request.headers) ?? "")),
  done: url.searchParams.get("done"),
}));

export const action = guardedAction("own-account", async ({ request }: Route.ActionArgs, person) => {
  const here = {
    sessionId: readSessionId(request.headers) ?? "",
    address: requestAddress(request.headers),
  };
  try {
    const { intent, made } = await runAccountAct(await request.formData(), person, here);
    if (made === null) return redirect(`/account?done=${intent}`);
    return { notice: undefined, fields: {} as Record<string, string>, ...made };
  } catch (error) {
    if (!(error instanceof AppError)) throw error;
    const { fault, init } = formFault(error);
    return data({ ...fault, token: null, recoveryCodes: null }, init);
  }
});

export default function Account({ loaderData, actionData }: Route.ComponentProps) {
  const { name, email, sessions, tokens, roles, secondFactor, owesSecondFactor, done } = loaderData;
  const said = done === null ? undefined : DONE[done];
  const fields = actionData?.fields ?? {};
  return (
    <>
      {said && !actionData && <Saved>{said}</Saved>}
      <h1 className="text-2xl sm:text-[2rem]">Your account</h1>
      <p className="mt-1 text-soft [overflow-wrap:anywhere]">
        {name}, {email}. Times are UTC.
      </p>
      {owesSecondFactor && (
        <Notice className="mt-4">
          You are a manager: set up a second factor here first. Then everything else opens.
        </Notice>
      )}
      {actionData?.notice && <Notice className="mt-4">{actionData.notice}</Notice>}
      <div className="mt-6 grid items-start gap-4 lg:grid-cols-2">
        <SecondFactor {...secondFactor} errors={fields} recoveryCodes={actionData?.recoveryCodes ?? null} />
        <PasswordForm key={said} errors={fields} />
        <SessionList sessions={sessions} endOthers />
        <OwnTokens tokens={tokens} roles={roles} errors={fields} made={actionData?.token ?? null} />
      </div>
    </>
  );
}
