import { readAuditSearch } from "~/schemas/people/audit-search";
import { exportAudit } from "~/services/audit/export-audit.server";
import { guardedLoader } from "~/services/people/guard.server";
import { streamText } from "~/utils/stream-text.server";
import type { Route } from "./+types/audit-file";

/** The events that a search finds, as a file to take away. */
export const loader = guardedLoader("audit", ({ url }: Route.LoaderArgs) => {
  const body = streamText(exportAudit(readAuditSearch(url.searchParams)));
  return new Response(body, {
    headers: {
      "Content-Type": "text/csv; charset=utf-8",
      "Content-Disposition": 'attachment; filename="audit.csv"',
      "Cache-Control": "no-store",
    },
  });
});
