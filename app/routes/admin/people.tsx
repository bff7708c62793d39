import { redirect } from "react-router";
import { AdminPlaces } from "~/components/admin/admin-places";
import { InviteForm } from "~/components/admin/invite-form";
import { PeopleList } from "~/components/admin/people-list";
import { TokenList } from "~/components/admin/token-list";
import { Notice } from "~/components/ui/notice";
import { Saved } from "~/components/ui/saved";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { endTheirToken } from "~/services/people/manage/end-their-token.server";
import { findPeople } from "~/services/people/manage/find-people.server";
import { findTokens } from "~/services/people/manage/get-person-page.server";
import { invitePerson } from "~/services/people/manage/invite-person.server";
import { rowNumber } from "~/utils/row-number";
import type { Route } from "./+types/people";
import { adminFault } from "./admin-fault";

export const meta: Route.MetaFunction = () => [{ title: "People · Cotterpin" }];

const DONE: Record<string, string> = {
  invited: "The invitation is in the outbox.",
  "token-ended": "The token has ended.",
};

export const loader = guardedLoader("people", async ({ url }: Route.LoaderArgs) => {
  const [people, tokens] = await Promise.all([findPeople(), findTokens(null)]);
  return { people, tokens, done: url.searchParams.get("done") };
});

export const action = guardedAction("people", async ({ request }: Route.ActionArgs, person) => {
  const form = await request.formData();
  try {
    if (form.get("intent") === "end-token") {
      await endTheirToken(null, rowNumber(String(form.get("token"))) ?? 0, person);
      return redirect("/admin/people?done=token-ended");
    }
    await invitePerson({ ...Object.fromEntries(form), roles: form.getAll("roles") }, person);
    return redirect("/admin/people?done=invited");
  } catch (error) {
    return adminFault(error);
  }
});

export default function People({ loaderData, actionData }: Route.ComponentProps) {
  const { people, tokens, done } = loaderData;
  const said = done === null ? undefined : DONE[done];
  return (
    <>
      <AdminPlaces />
      {said && !actionData && <Saved>{said}</Saved>}
      <h1 className="text-2xl sm:text-[2rem]">People</h1>
      <p className="mt-1 max-w-prose text-soft">
        Who may come in, and what for. Open a person to change their roles, end their sessions or keep them
        out. Times are UTC.
      </p>
      {actionData?.notice && <Notice className="mt-4">{actionData.notice}</Notice>}
      <div className="mt-6 grid items-start gap-4 xl:grid-cols-[minmax(0,2fr)_minmax(20rem,1fr)]">
        <div className="grid gap-4">
          <PeopleList people={people} />
          <TokenList
            title="Tokens that stand for a role"
            tokens={tokens}
            empty="None. The command npm run token prints one for other programs."
          />
        </div>
        <InviteForm key={people.length} errors={actionData?.fields ?? {}} />
      </div>
    </>
  );
}
