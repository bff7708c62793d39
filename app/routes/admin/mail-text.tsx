import { data, Form, Link, redirect } from "react-router";
import { AdminPlaces } from "~/components/admin/admin-places";
import { MailState } from "~/components/admin/mail-state";
import { Notice } from "~/components/ui/notice";
import { getMail } from "~/services/mail/get-mail.server";
import { retryMail } from "~/services/mail/retry-mail.server";
import { guardedAction, guardedLoader } from "~/services/people/guard.server";
import { AppError } from "~/utils/errors";
import { formatMoment } from "~/utils/format/format-moment";
import { rowNumber } from "~/utils/row-number";
import type { Route } from "./+types/mail-text";

export const meta: Route.MetaFunction = ({ loaderData }) => [
  { title: `${loaderData?.subject ?? "Mail"} · Cotterpin` },
];

export const loader = guardedLoader("settings", ({ params }: Route.LoaderArgs) =>
  getMail(rowNumber(params.id) ?? 0),
);

export const action = guardedAction("settings", async ({ params }: Route.ActionArgs, person) => {
  try {
    await retryMail(rowNumber(params.id) ?? 0, person);
    return redirect(`/admin/mail/${params.id}`);
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== "conflict") throw error;
    return data({ problem: error.message }, { status: 409 });
  }
});

/** Addresses of web pages in a text become links. */
function linked(body: string) {
  return body.split(/(https?:\/\/[^\s…]+)/).map((piece, index) =>
    index % 2 === 1 ? (
      <a key={piece} href={piece} className="underline [overflow-wrap:anywhere]">
        {piece}
      </a>
    ) : (
      piece
    ),
  );
}

export default function MailText({ loaderData: mail, actionData }: Route.ComponentProps) {
  return (
    <>
      <AdminPlaces />
      <h1 className="text-2xl sm:text-[2rem]">{mail.subject}</h1>
      {actionData && <Notice className="mt-4">{actionData.problem}</Notice>}
      <div className="mt-2 grid gap-1">
        <p className="[overflow-wrap:anywhere]">
          to {mail.to}, <span className="figure">{formatMoment(mail.createdAt)}</span> UTC
        </p>
        <MailState mail={mail} />
      </div>
      <div className="sheet mt-6 max-w-prose whitespace-pre-wrap">{linked(mail.body)}</div>
      <div className="mt-6 flex flex-wrap items-center gap-4">
        {mail.state === "dead" && (
          <Form method="post">
            <button type="submit" className="button button-main">
              Try again
            </button>
          </Form>
        )}
        <Link to="/admin/mail" className="px-2 py-3 underline">
          All mails
        </Link>
      </div>
    </>
  );
}
