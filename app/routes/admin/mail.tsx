import { Link } from "react-router";
import { AdminPlaces } from "~/components/admin/admin-places";
import { MailState } from "~/components/admin/mail-state";
import { findMails } from "~/services/mail/find-mails.server";
import { guardedLoader } from "~/services/people/guard.server";
import { formatMoment } from "~/utils/format/format-moment";
import { rowNumber } from "~/utils/row-number";
import type { Route } from "./+types/mail";

export const meta: Route.MetaFunction = () => [{ title: "Mail · Cotterpin" }];

export const loader = guardedLoader("settings", ({ url }: Route.LoaderArgs) =>
  findMails(rowNumber(url.searchParams.get("below"))),
);

export default function Mail({ loaderData }: Route.ComponentProps) {
  const { mails, next, hasServer } = loaderData;
  return (
    <>
      <AdminPlaces />
      <h1 className="text-2xl sm:text-[2rem]">Mail</h1>
      <p className="mt-1 max-w-prose text-soft">
        {hasServer
          ? "What the program has written, newest first. A mail that fails is tried eight times within about two hours. Times are UTC."
          : "No mail server is set, so this mailbox keeps what the program has written, newest first: open a mail to hand its link on yourself. Times are UTC."}
      </p>
      {mails.length === 0 && (
        <p className="mt-6 text-lg">No mail yet. An invitation or a forgotten password writes the first.</p>
      )}
      {mails.length > 0 && (
        <ul className="sheet mt-6" aria-label="Mails">
          {mails.map((mail) => (
            <li
              key={mail.id}
              className="grid gap-x-6 gap-y-1 border-line border-b py-3 last:border-b-0 md:grid-cols-[minmax(0,2fr)_minmax(0,1fr)_12rem]"
            >
              <div className="min-w-0">
                <Link to={`/admin/mail/${mail.id}`} className="font-bold underline">
                  {mail.subject}
                </Link>
                <p className="[overflow-wrap:anywhere]">to {mail.to}</p>
              </div>
              <MailState mail={mail} />
              <p className="figure text-soft md:text-right">{formatMoment(mail.createdAt)}</p>
            </li>
          ))}
        </ul>
      )}
      {next !== null && (
        <p className="mt-6">
          <Link to={`/admin/mail?below=${next}`} className="button">
            Older mails
          </Link>
        </p>
      )}
    </>
  );
}
