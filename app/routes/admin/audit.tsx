import { Link, useLocation } from "react-router";
import { AdminPlaces } from "~/components/admin/admin-places";
import { AuditList } from "~/components/admin/audit-list";
import { AuditSearchForm } from "~/components/admin/audit-search-form";
import { readAuditSearch } from "~/schemas/people/audit-search";
import { findAuditActs } from "~/services/audit/find-audit-acts.server";
import { findAuditEvents } from "~/services/audit/find-audit-events.server";
import { guardedLoader } from "~/services/people/guard.server";
import { rowNumber } from "~/utils/row-number";
import type { Route } from "./+types/audit";

export const meta: Route.MetaFunction = () => [{ title: "Audit · Cotterpin" }];

export const loader = guardedLoader("audit", async ({ url }: Route.LoaderArgs) => {
  const search = readAuditSearch(url.searchParams);
  const below = rowNumber(url.searchParams.get("below"));
  const [page, acts] = await Promise.all([findAuditEvents(search, { below }), findAuditActs()]);
  return { ...page, acts, search };
});

export default function Audit({ loaderData }: Route.ComponentProps) {
  const { events, next, acts, search } = loaderData;
  const parameters = new URLSearchParams(useLocation().search);
  parameters.delete("below");
  const older = new URLSearchParams(parameters);
  if (next !== null) older.set("below", String(next));
  return (
    <>
      <AdminPlaces />
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div>
          <h1 className="text-2xl sm:text-[2rem]">Audit</h1>
          <p className="mt-1 max-w-prose text-soft">
            Who did what, newest first. It is only ever added to. Times are UTC.
          </p>
        </div>
        <a href={`/admin/audit.csv?${parameters}`} className="button" download>
          Take out as CSV
        </a>
      </div>
      <div className="mt-6 grid gap-4">
        <AuditSearchForm search={search} acts={acts} />
        {events.length > 0 ? (
          <AuditList events={events} />
        ) : (
          <p className="py-4 text-lg">
            Nothing was done that this search finds. Take a word away, or show all.
          </p>
        )}
      </div>
      {next !== null && (
        <p className="mt-6">
          <Link to={`/admin/audit?${older}`} className="button">
            Older events
          </Link>
        </p>
      )}
    </>
  );
}
