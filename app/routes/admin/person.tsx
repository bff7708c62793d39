import { Form, Link, redirect } from "react-router";
import { AdminPlaces } from "~/components/admin/admin-places";
import { PERSON_STATES } from "~/components/admin/person-facts";
import { PlaceForm } from "~/components/admin/place-form";
import { RoleBoxes } from "~/components/admin/role-boxes";
import { SessionList } from "~/components/admin/session-list";
import { TokenList } from "~/components/admin/token-list";
import { Notice } from "~/components/ui/notice";
import { Saved } from "~/components/ui/saved";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { getPersonPage } from "~/services/people/manage/get-person-page.server";
import { rowNumber } from "~/utils/row-number";
import type { Route } from "./+types/person";
import { adminFault } from "./admin-fault";
import { runPersonAct } from "./run-person-act";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.person.name ?? "Person"} · Cotterpin` },
];

const DONE: Record<string, string> = {
  roles: "The roles are changed, and their sessions have ended: they sign in again.",
  disable: "This person is kept out: their sessions and tokens have ended.",
  enable: "This person may sign in again.",
  "invite-again": "Another invitation is in the outbox; the one before does not work any more.",
  "reset-factor":
    "The second factor is taken away and their sessions have ended: the password alone lets them in.",
  "end-session": "The session has ended.",
  "end-token": "The token has ended.",
};

export const loader = guardedLoader("people", async ({ params, url }: Route.LoaderArgs) => ({
  ...(await getPersonPage(rowNumber(params.id) ?? 0)),
  done: url.searchParams.get("done"),
}));

export const action = guardedAction("people", async ({ request, params }: Route.ActionArgs, person) => {
  const form = await request.formData();
  try {
    const act = await runPersonAct(rowNumber(params.id) ?? 0, form, person);
    return redirect(`/admin/people/${params.id}?done=${act}`);
  } catch (error) {
    return adminFault(error);
  }
});

export default function Person({ loaderData, actionData }: Route.ComponentProps) {
  const { person, sessions, tokens, invitedUntil, hasSecondFactor, done } = loaderData;
  const said = done === null ? undefined : DONE[done];
  return (
    <>
      <AdminPlaces />
      {said && !actionData && <Saved>{said}</Saved>}
      <p>
        <Link to="/admin/people" className="inline-block py-2 underline">
          Everybody
        </Link>
      </p>
      <h1 className="text-2xl sm:text-[2rem]">{person.name}</h1>
      <p className="mt-1 text-soft [overflow-wrap:anywhere]">
        {person.email}, {PERSON_STATES[person.state]}. Times are UTC.
      </p>
      {actionData?.notice && <Notice className="mt-4">{actionData.notice}</Notice>}
      <div className="mt-6 grid items-start gap-4 lg:grid-cols-2">
        <Form method="post" className="sheet grid gap-4" aria-label="Roles of this person">
          <RoleBoxes key={person.roles.join()} chosen={person.roles} error={actionData?.fields.roles} />
          <p className="text-soft">A change ends their sessions, so that nothing goes on under old rights.</p>
          <div>
            <button type="submit" name="intent" value="roles" className="button button-main">
              Change the roles
            </button>
          </div>
        </Form>
        <PlaceForm state={person.state} invitedUntil={invitedUntil} hasSecondFactor={hasSecondFactor} />
        <SessionList sessions={sessions} />
        <TokenList title="Tokens" tokens={tokens} empty="None." />
      </div>
      <p className="mt-6">
        <Link to={`/admin/audit?subject=${encodeURIComponent(`person ${person.id}`)}`} className="underline">
          What was changed about this person
        </Link>
      </p>
    </>
  );
}
